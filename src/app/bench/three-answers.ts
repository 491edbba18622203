import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';

let count = 0;

/** Yes, no, or not known: what is not known is never taken for no. */
@Component({
  selector: 'app-three-answers',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <fieldset>
      <legend>{{ question() }}</legend>
      <div>
        @for (answer of answers; track answer.words) {
          <label>
            <input type="radio" [name]="name" [checked]="value() === answer.value" (change)="answered.emit(answer.value)" />
            <span>{{ answer.words }}</span>
          </label>
        }
      </div>
    </fieldset>
  `,
  styles: `
    fieldset {
      display: flex;
      flex-wrap: wrap;
      align-items: center;
      justify-content: space-between;
      gap: 4px 12px;
      min-width: 0;
      margin: 0;
      padding: 0;
      border: 0;
    }
    legend {
      float: left;
      padding: 0;
      font-size: 14px;
    }
    div {
      display: flex;
      border: 1px solid var(--sy-edge);
      border-radius: 6px;
      overflow: hidden;
    }
    label {
      position: relative;
      cursor: pointer;
    }
    label + label {
      border-left: 1px solid var(--sy-line);
    }
    input {
      position: absolute;
      inset: 0;
      opacity: 0;
      margin: 0;
      cursor: pointer;
    }
    span {
      display: block;
      padding: 4px 9px;
      color: var(--sy-soft);
      font-size: 13px;
      line-height: 18px;
    }
    input:checked + span {
      background: var(--sy-ink);
      color: var(--sy-sheet);
    }
    input:focus-visible + span {
      outline: 2px solid var(--sy-copper);
      outline-offset: -2px;
    }
    @media (pointer: coarse) {
      span {
        padding: 9px 12px;
      }
    }
  `,
})
export class ThreeAnswers {
  readonly question = input.required<string>();
  readonly value = input.required<boolean | undefined>();
  readonly answered = output<boolean | undefined>();
  protected readonly name = `three-answers-${++count}`;
  protected readonly answers = [
    { value: true, words: 'yes' },
    { value: false, words: 'no' },
    { value: undefined, words: 'not known' },
  ];
}

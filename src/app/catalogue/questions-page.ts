import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import { type Catalogue } from '@shared/contracts/catalogue';
import { CatalogueFrame } from './catalogue-frame';
import { questionsOf } from './questions';

/** Questions answered, each to be opened; without scripts too. */
@Component({
  selector: 'app-questions-page',
  imports: [RouterLink, CatalogueFrame],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-catalogue-frame [trail]="trail">
      <h1>Questions</h1>
      <p class="lead">Asked by those who buy, fit or look through sealed units; answered as far as one honestly can.</p>
      <div class="list">
        @for (each of questions(); track each.id) {
          <details>
            <summary>
              <h2>{{ each.question }}</h2>
            </summary>
            <div [id]="each.id">
              @for (words of each.answer; track $index) {
                <p>{{ words }}</p>
              }
              @if (each.more; as more) {
                <p>
                  <a [routerLink]="more.path">{{ more.text }}</a>
                </p>
              }
            </div>
          </details>
        }
      </div>
    </app-catalogue-frame>
  `,
  styleUrl: './catalogue.scss',
  styles: `
    .list {
      margin-top: 24px;
      border-top: 1px solid var(--sy-line);
    }
    details {
      border-bottom: 1px solid var(--sy-line);
    }
    summary {
      display: flex;
      align-items: baseline;
      gap: 14px;
      padding: 14px 0;
      cursor: pointer;
      list-style: none;
    }
    summary::-webkit-details-marker {
      display: none;
    }
    summary::before {
      content: '+';
      flex: none;
      width: 14px;
      color: var(--sy-copper);
      font-weight: 700;
      font-size: 18px;
    }
    details[open] summary::before {
      content: '−';
    }
    summary h2 {
      margin: 0;
      font-size: 17px;
    }
    details p {
      margin-left: 28px;
    }
    details > div {
      padding-bottom: 12px;
    }
  `,
})
export class QuestionsPage {
  readonly catalogue = input.required<Catalogue>();
  protected readonly trail = [{ name: 'Catalogue', path: '/catalogue' }];
  protected readonly questions = computed(() => questionsOf(this.catalogue()));
}

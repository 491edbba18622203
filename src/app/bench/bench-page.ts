import { afterNextRender, ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { CurrentCatalogue } from '../api-client/current-catalogue';
import { ProblemNote } from '../ui/problem-note';
import { ReaderMeasures } from './reader-measures';
import { Workbench } from './workbench';

/** Specify one unit and see at once what comes of it and, signed in, what it costs. */
@Component({
  selector: 'app-bench-page',
  imports: [ProblemNote, Workbench],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (source.catalogue()) {
      <app-workbench />
    } @else if (source.problem(); as problem) {
      <div class="sy-page">
        <app-problem-note heading="The catalogue is not here." [problem]="problem" (retry)="source.reload()" />
      </div>
    } @else {
      <div class="sy-page late" aria-hidden="true"><span class="sy-waiting"></span><span class="sy-waiting"></span></div>
    }
  `,
  styles: `
    .late {
      display: grid;
      gap: 12px;
      animation: appear 0.01s 0.3s both;
    }
    .sy-waiting {
      min-height: 120px;
    }
    @keyframes appear {
      from {
        visibility: hidden;
      }
    }
  `,
})
export class BenchPage {
  protected readonly source = inject(CurrentCatalogue);

  constructor() {
    const measures = inject(ReaderMeasures);
    afterNextRender(() => measures.recall());
  }
}

import { ChangeDetectionStrategy, Component } from '@angular/core';
import { RouterOutlet } from '@angular/router';
import { Header } from './header';

@Component({
  selector: 'app-root',
  imports: [RouterOutlet, Header],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <a class="skip" href="#content">To the content</a>
    <app-header />
    <main id="content" tabindex="-1"><router-outlet /></main>
  `,
  styles: `
    main:focus {
      outline: none;
    }
    .skip {
      position: absolute;
      left: 12px;
      top: -60px;
      padding: 8px 14px;
      background: var(--sy-sheet);
      z-index: 20;
    }
    .skip:focus {
      top: 8px;
    }
  `,
})
export class App {}

import { DOCUMENT, inject, Injectable, signal } from '@angular/core';

/** Light or dark: the system's choice until one turns it here. */
@Injectable({ providedIn: 'root' })
export class Scheme {
  private readonly document = inject(DOCUMENT);
  readonly dark = signal(this.startsDark());

  turn(): void {
    this.dark.update((dark) => !dark);
    const scheme = this.dark() ? 'dark' : 'light';
    this.document.documentElement.style.colorScheme = scheme;
    try {
      this.document.defaultView?.localStorage.setItem('scheme', scheme);
    } catch {
      // Storage may be closed to us; the choice then lasts as long as the page.
    }
  }

  private startsDark(): boolean {
    const chosen = this.document.documentElement.style.colorScheme;
    if (chosen) return chosen === 'dark';
    return this.document.defaultView?.matchMedia?.('(prefers-color-scheme: dark)').matches ?? false;
  }
}

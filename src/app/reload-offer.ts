import { DOCUMENT, type ErrorHandler, inject, Injectable } from '@angular/core';

const CHUNK_GONE =
  /Failed to fetch dynamically imported module|error loading dynamically imported module|Importing a module script failed/i;

/** Reports errors; where a part of the application is gone after a deploy, offers a reload. */
@Injectable()
export class ReloadOffer implements ErrorHandler {
  private readonly document = inject(DOCUMENT);

  handleError(error: unknown): void {
    console.error(error);
    if (error instanceof Error && CHUNK_GONE.test(error.message)) this.offer();
  }

  private offer(): void {
    if (this.document.getElementById('reload-offer')) return;
    const bar = this.document.createElement('div');
    bar.id = 'reload-offer';
    bar.className = 'sy-note';
    bar.setAttribute('role', 'alert');
    bar.style.cssText = 'position: fixed; inset: auto 16px 16px; z-index: 50;';
    bar.append('Sealyard was updated, or the connection is gone. What you typed on the Bench is kept in the address. ');
    const reload = this.document.createElement('button');
    reload.textContent = 'Reload';
    reload.addEventListener('click', () => this.document.defaultView?.location.reload());
    bar.append(reload);
    this.document.body.append(bar);
  }
}

import { Injectable } from '@angular/core';

/** Numbers the drawings of a page, so that ids within them are unique; the same on server and in the browser. */
@Injectable({ providedIn: 'root' })
export class DrawingIds {
  private last = 0;

  next(): string {
    this.last += 1;
    return `drawing-${this.last}`;
  }
}

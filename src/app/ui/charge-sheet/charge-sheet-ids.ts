import { Injectable } from '@angular/core';

/** Numbers the charge sheets of a page, so that ids within them are unique. */
@Injectable({ providedIn: 'root' })
export class ChargeSheetIds {
  private last = 0;

  next(): string {
    this.last += 1;
    return `charges-${this.last}`;
  }
}

import { inject, Pipe, type PipeTransform } from '@angular/core';
import { DayPipe } from './date-pipes';

/** Days within a sentence of the server, `2026-12-11`, as the reader writes them: `Dec 11, 2026`. */
@Pipe({ name: 'readableDays' })
export class ReadableDaysPipe implements PipeTransform {
  private readonly days = inject(DayPipe);

  transform(text: string | null | undefined): string {
    return (text ?? '').replace(/\b\d{4}-\d{2}-\d{2}\b/g, (day) => this.days.transform(day));
  }
}

import { type BodyOf } from '@shared/contracts/endpoint';
import { type changeQuoteLines, type QuoteLine } from '@shared/contracts/quotes';

/** A line as it is sent back: with its identity where it is one of the quote's. */
export type LineSent = BodyOf<typeof changeQuoteLines>['lines'][number];

/** The whole list of lines as it should be, made from the list as it is. */
export type LinesEdit = (lines: readonly QuoteLine[]) => LineSent[];

/** What one can change of a line in its place. */
export type LineChange = Partial<Pick<QuoteLine, 'unit' | 'quantity' | 'tag'>>;

/** A line as it is sent back. */
export function asSent({ id, unit, quantity, tag, extras }: Omit<QuoteLine, 'id'> & { id?: string }): LineSent {
  return {
    ...(id === undefined ? {} : { id }),
    unit,
    quantity,
    ...(tag === null ? {} : { tag }),
    ...(extras.length > 0 ? { extras } : {}),
  };
}

export function changeLine(id: string, change: LineChange): LinesEdit {
  return (lines) => lines.map((line) => asSent(line.id === id ? { ...line, ...change } : line));
}

/** The same line once more, right after it. */
export function copyLine(id: string): LinesEdit {
  return (lines) => lines.flatMap((line) => (line.id === id ? [asSent(line), asSent({ ...line, id: undefined })] : [asSent(line)]));
}

/** The line one up (−1) or down (1); at the end of the list it stays. */
export function moveLine(id: string, by: -1 | 1): LinesEdit {
  return (lines) => {
    const sent = lines.map(asSent);
    const from = sent.findIndex((line) => line.id === id);
    const to = from + by;
    const [one, other] = [sent[from], sent[to]];
    if (one && other) [sent[from], sent[to]] = [other, one];
    return sent;
  };
}

export function removeLine(id: string): LinesEdit {
  return (lines) => lines.filter((line) => line.id !== id).map(asSent);
}

/** A line that was removed, back where it stood; the other lines stay as they are now. */
export function putBackLine(line: QuoteLine, index: number): LinesEdit {
  return (lines) => lines.map(asSent).toSpliced(index, 0, asSent({ ...line, id: undefined }));
}

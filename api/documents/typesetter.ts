import { registerFonts, runsOf, type Weight } from './fonts';
import { paperColors } from './paper-colors';
import { type Role } from '@shared/drawings/drawing';

export interface Style {
  size: number;
  weight?: Weight;
  role?: Role;
}

/** Lato's letters reach this far above the baseline, in sizes; a line of text takes `LEADING`. */
const ASCENT = 0.99;
export const LEADING = 1.28;

/** A space that a line may break at: not one within a measure such as `36 1/2 in`. */
const breakable = / (?!(?<=\d )(?:\d+\/\d|in\b|mm\b|%))/;

/** Sets text on the pages of one PDF: measures, breaks lines and writes. All in points. */
export function createTypesetter(doc: PDFKit.PDFDocument) {
  registerFonts(doc);

  const width = (text: string, { size, weight = 400 }: Style): number =>
    runsOf(text, weight).reduce((sum, run) => sum + doc.font(run.font).fontSize(size).widthOfString(run.text), 0);

  /** Writes one line with its baseline at `y`; `x` is its start, middle or end. */
  const writeLine = (text: string, x: number, y: number, style: Style, anchor: 'start' | 'middle' | 'end' = 'start'): void => {
    const { size, weight = 400, role = 'ink' } = style;
    let at = x - { start: 0, middle: 0.5, end: 1 }[anchor] * (anchor === 'start' ? 0 : width(text, style));
    doc.fillColor(paperColors[role]);
    for (const run of runsOf(text, weight)) {
      doc.font(run.font).fontSize(size);
      doc.text(run.text, at, y, { lineBreak: false, baseline: 'alphabetic' });
      at += doc.widthOfString(run.text);
    }
  };

  /** Breaks text into lines of at most `room`, between words; a word longer than that within itself. */
  const wrap = (text: string, room: number, style: Style): string[] =>
    text.split('\n').flatMap((paragraph) => wrapParagraph(paragraph, room, style));

  const wrapParagraph = (paragraph: string, room: number, style: Style): string[] => {
    const lines: string[] = [];
    let current = '';
    for (const word of paragraph.split(breakable)) {
      const longer = current === '' ? word : `${current} ${word}`;
      if (width(longer, style) <= room) {
        current = longer;
        continue;
      }
      if (current !== '') lines.push(current);
      current = '';
      for (const letter of word) {
        if (current !== '' && width(current + letter, style) > room) {
          lines.push(current);
          current = '';
        }
        current += letter;
      }
    }
    return [...lines, current];
  };

  return {
    width,
    wrap,
    writeLine,
    /** Height that lines of this style take. */
    height: (lines: number, { size }: Style): number => lines * size * LEADING,
    /** Writes lines below `y`, the top of the first; returns where the next may start. */
    write: (lines: readonly string[], x: number, y: number, style: Style, anchor: 'start' | 'middle' | 'end' = 'start'): number => {
      for (const [i, line] of lines.entries()) writeLine(line, x, y + (i * LEADING + ASCENT) * style.size, style, anchor);
      return y + lines.length * style.size * LEADING;
    },
  };
}
export type Typesetter = ReturnType<typeof createTypesetter>;

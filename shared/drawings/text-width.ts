/**
 * Advance widths of Lato Regular for U+0020 to U+007E, in thousandths of the size; read from
 * the `hmtx` table of `lato-latin-400-normal.woff` in @fontsource/lato 5.3.0. All figures are
 * equally wide.
 */
const widths = [
  193, 343, 397, 580, 580, 786, 703, 230, 300, 300, 400, 580, 225, 347, 212, 373, 580, 580, 580, 580, 580, 580, 580, 580, 580, 580, 252,
  252, 580, 580, 580, 398, 822, 680, 647, 685, 753, 581, 566, 734, 756, 307, 444, 681, 514, 920, 756, 798, 611, 798, 644, 530, 590, 730,
  680, 1019, 643, 629, 624, 300, 375, 300, 580, 394, 307, 507, 559, 467, 559, 524, 337, 511, 556, 256, 254, 524, 256, 821, 556, 556, 552,
  559, 403, 434, 373, 556, 512, 766, 504, 512, 462, 300, 300, 300, 580,
];
/** Of the accented letters and signs beyond; the widest of Latin-1 takes 929. */
const beyond = 700;

/** How wide a line of text is at a size, unit of the size; the drawing's one way to know what fits. */
export function textWidth(text: string, size: number): number {
  let total = 0;
  for (const letter of text) total += widths[letter.codePointAt(0)! - 32] ?? beyond;
  return (total * size) / 1000;
}

/** The text, cut with an ellipsis to fit a width. */
export function fitText(text: string, size: number, width: number): string {
  if (textWidth(text, size) <= width) return text;
  const letters = [...text];
  while (letters.length > 0 && textWidth(`${letters.join('')}…`, size) > width) letters.pop();
  return `${letters.join('').trimEnd()}…`;
}

/** The text in at most `lines` lines that fit a width, broken between words; the last is cut where the rest does not fit. */
export function wrapText(text: string, size: number, width: number, lines: number): string[] {
  const wrapped: string[] = [];
  let current = '';
  const words = text.split(/\s+/).filter((word) => word !== '');
  for (const [i, word] of words.entries()) {
    const longer = current === '' ? word : `${current} ${word}`;
    if (current === '' || textWidth(longer, size) <= width) {
      current = longer;
      continue;
    }
    if (wrapped.length === lines - 1) {
      current = [current, ...words.slice(i)].join(' ');
      break;
    }
    wrapped.push(fitText(current, size, width));
    current = word;
  }
  return [...wrapped, fitText(current, size, width)];
}

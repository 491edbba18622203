import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import PDFDocument from 'pdfkit';

/** Lato, embedded as subsets; each weight in two files, the second with letters of Central Europe. */

export type Weight = 400 | 700;
export type FontName = `${'latin' | 'latin-ext'}-${Weight}`;

const names: FontName[] = ['latin-400', 'latin-700', 'latin-ext-400', 'latin-ext-700'];

interface Loaded {
  file: Buffer;
  /** the characters it holds, which are fewer than its ranges promise */
  letters: Set<number>;
}
let loaded: Map<FontName, Loaded> | undefined;

/** The font files, read once: a dependency's own, for the process runs in the project's folder. */
function fonts(): Map<FontName, Loaded> {
  loaded ??= new Map(
    names.map((name) => {
      const file = readFileSync(join(process.cwd(), 'node_modules/@fontsource/lato/files', `lato-${name}-normal.woff`));
      // On a document of its own: opening a font leaves traces in the file it is for.
      const scratch = new PDFDocument({ autoFirstPage: false }).font(file);
      // pdfkit shows the open font nowhere else.
      const { font } = (scratch as unknown as { _font: { font: { characterSet: number[] } } })._font;
      return [name, { file, letters: new Set(font.characterSet) }];
    }),
  );
  return loaded;
}

export function registerFonts(doc: PDFKit.PDFDocument): void {
  for (const [name, { file }] of fonts()) doc.registerFont(name, file);
}

/** A part of a text that one font file holds. */
export interface Run {
  font: FontName;
  text: string;
}

/** Signs that Lato lacks and that have another way to be written. */
const otherwise: Record<string, string> = { '≈': 'about', '→': '-', '‑': '-', '\u202f': '\u00a0', '\t': ' ' };

/**
 * The text as runs, each in the font file that holds its letters. A letter that neither holds
 * loses its accent; what is left without a sign becomes a question mark, so that nobody takes a
 * gap for nothing.
 */
export function runsOf(text: string, weight: Weight): Run[] {
  const fontFor = (letter: string): FontName | undefined =>
    ([`latin-${weight}`, `latin-ext-${weight}`] as const).find((name) => fonts().get(name)?.letters.has(letter.codePointAt(0)!));
  const runs: Run[] = [];
  const add = (letter: string, font: FontName) => {
    const last = runs.at(-1);
    if (last?.font === font) last.text += letter;
    else runs.push({ font, text: letter });
  };
  for (const letter of text.normalize('NFC')) {
    const font = fontFor(letter);
    if (font) {
      add(letter, font);
      continue;
    }
    for (const written of otherwise[letter] ?? (letter.normalize('NFKD').replace(/\p{M}/gu, '') || '?')) {
      const found = fontFor(written);
      add(found ? written : '?', found ?? `latin-${weight}`);
    }
  }
  return runs;
}

import PDFDocument from 'pdfkit';
import { type Role } from '@shared/drawings/drawing';
import { type MeasureSystem } from '@shared/measures/parse-length';
import { paperColors } from './paper-colors';
import { createTypesetter, type Typesetter } from './typesetter';

export interface PaperOptions {
  measureSystem: MeasureSystem;
  title: string;
  author: string;
  /** stands in the file as the day it was made, so that the same model gives the same bytes; UTC epoch ms */
  at: number;
  /** at the foot of every page, beside the page number */
  foot: string;
}

/** Pages to write on from top to bottom, in points. */
export interface Paper {
  doc: PDFKit.PDFDocument;
  type: Typesetter;
  left: number;
  right: number;
  width: number;
  bottom: number;
  /** where the next thing goes */
  y: number;
  /** written again at the top of each page while a table runs on */
  tableHead: (() => void) | null;
  newPage(): void;
  /** Goes on to a new page unless there is room for `needed` below. */
  demand(needed: number): void;
  rule(y: number, role?: Role, from?: number, to?: number, weight?: number): void;
  /** Numbers the pages and closes the document. */
  finish(): Promise<Uint8Array>;
}

const MARGIN = 48;
const FOOT = 30;

/** Letter for imperial companies, A4 for metric ones. */
export function createPaper({ measureSystem, title, author, at, foot }: PaperOptions): Paper {
  const doc = new PDFDocument({
    size: measureSystem === 'imperial' ? 'LETTER' : 'A4',
    margin: 0,
    bufferPages: true,
    lang: 'en',
    displayTitle: true,
    pdfVersion: '1.7',
    info: { Title: title, Author: author, Creator: 'Sealyard', Producer: 'Sealyard', CreationDate: new Date(at) },
  });
  const chunks: Buffer[] = [];
  const ended = new Promise<void>((resolve, reject) => {
    doc.on('data', (chunk: Buffer) => chunks.push(chunk));
    doc.on('end', resolve);
    doc.on('error', reject);
  });
  const { width, height } = doc.page;
  const type = createTypesetter(doc);
  const paper: Paper = {
    doc,
    type,
    left: MARGIN,
    right: width - MARGIN,
    width: width - 2 * MARGIN,
    bottom: height - MARGIN - FOOT,
    y: MARGIN,
    tableHead: null,

    newPage: () => {
      doc.addPage();
      paper.y = MARGIN;
      paper.tableHead?.();
    },

    demand: (needed) => {
      if (paper.y + needed > paper.bottom) paper.newPage();
    },

    rule: (y, role = 'line', from = paper.left, to = paper.right, weight = 0.6) => {
      doc.moveTo(from, y).lineTo(to, y).lineWidth(weight).strokeColor(paperColors[role]).stroke();
    },

    finish: async () => {
      const { count } = doc.bufferedPageRange();
      const style = { size: 8, role: 'soft' as const };
      for (let i = 0; i < count; i++) {
        doc.switchToPage(i);
        const y = height - MARGIN + 8;
        const number = `page ${i + 1} of ${count}`;
        const [line = ''] = type.wrap(foot, paper.width - type.width(number, style) - 20, style);
        type.writeLine(line, paper.left, y, style);
        type.writeLine(number, paper.right, y, style, 'end');
      }
      doc.end();
      await ended;
      return new Uint8Array(Buffer.concat(chunks));
    },
  };
  return paper;
}

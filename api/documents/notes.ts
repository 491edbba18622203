import { type Paper } from './paper';

const heading = { size: 9.5, weight: 700 as const };
const body = { size: 9 };
const small = { size: 8, role: 'soft' as const };

/** Under drawings: what they are for, and what no document of ours decides. */
const CAUTION =
  'Drawings are to scale and for reading; the written sizes count. This document does not certify that a unit suits its place: local codes and a licensed professional decide on safety glazing, wind and snow load, guarding, overhead glazing and thermal stress.';

/** A heading with text below it; runs on over pages line by line. */
export function writeNote(paper: Paper, title: string, text: string): void {
  const lines = paper.type.wrap(text, paper.width * 0.8, body);
  paper.demand(paper.type.height(1, heading) + paper.type.height(Math.min(lines.length, 3), body));
  paper.y = paper.type.write([title], paper.left, paper.y, heading) + 1;
  for (const line of lines) {
    paper.demand(paper.type.height(1, body));
    paper.y = paper.type.write([line], paper.left, paper.y, body);
  }
  paper.y += 10;
}

export function writeCaution(paper: Paper): void {
  const lines = paper.type.wrap(CAUTION, paper.width * 0.8, small);
  paper.demand(paper.type.height(lines.length, small));
  paper.y = paper.type.write(lines, paper.left, paper.y, small) + 10;
}

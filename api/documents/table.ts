import { type Paper } from './paper';
import { type Style } from './typesetter';

/** A column of a table; numbers align at the end. */
export interface Column {
  head: string;
  width: number;
  align: 'start' | 'end';
}

const headStyle: Style = { size: 8, role: 'soft' };
const GAP = 8;

/** Where a column's text starts, or ends for one that aligns there. */
export function columnX(columns: readonly Column[], index: number, left: number): number {
  const before = columns.slice(0, index).reduce((sum, { width }) => sum + width, left);
  return columns[index]!.align === 'end' ? before + columns[index]!.width : before;
}

/** Writes the head of a table, now and at the top of each page until `endTable`. */
export function startTable(paper: Paper, columns: readonly Column[]): void {
  paper.tableHead = () => {
    for (const [i, { head, align }] of columns.entries()) {
      paper.type.writeLine(head, columnX(columns, i, paper.left), paper.y + 8, headStyle, align);
    }
    paper.y += 13;
    paper.rule(paper.y, 'ink', paper.left, paper.right, 0.8);
    paper.y += 5;
  };
  paper.tableHead();
}

export function endTable(paper: Paper): void {
  paper.tableHead = null;
}

/** One row of texts, each wrapped in its column; the row stays on one page. */
export function writeRow(paper: Paper, columns: readonly Column[], cells: readonly string[], style: Style, padding = 3): void {
  const wrapped = cells.map((cell, i) => paper.type.wrap(cell, columns[i]!.width - (columns[i]!.align === 'start' ? GAP : 0), style));
  const height = Math.max(...wrapped.map((lines) => paper.type.height(lines.length, style)));
  paper.demand(height + padding);
  for (const [i, lines] of wrapped.entries()) {
    paper.type.write(lines, columnX(columns, i, paper.left), paper.y, style, columns[i]!.align);
  }
  paper.y += height + padding;
}

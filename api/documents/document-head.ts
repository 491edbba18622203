import { type Party, type Sender } from './document-models';
import { paperColors } from './paper-colors';
import { type Paper } from './paper';

const small = { size: 8, role: 'soft' as const };
const body = { size: 9.5 };
const strong = { size: 9.5, weight: 700 as const };

/** A fact at the right of the head: what it is and what it says. */
export type Fact = [name: string, value: string];

export interface HeadContent {
  sender: Sender;
  title: string;
  number: string;
  /** whom it is for and the like, side by side */
  parties: { heading: string; party: Party }[];
  facts: Fact[];
}

/** The head of the first page: the sender's letterhead, what the document is, for whom, and its facts. */
export function writeHead(paper: Paper, { sender, title, number, parties, facts }: HeadContent): void {
  const { doc, type } = paper;
  const senderRoom = paper.width * 0.55;
  doc.rect(paper.left, paper.y, 30, 2.6).fill(paperColors.copper);
  const top = paper.y + 10;
  let y = type.write(type.wrap(sender.name, senderRoom, { size: 14, weight: 700 }), paper.left, top, { size: 14, weight: 700 }) + 2;
  const contact = [sender.email, sender.phone].filter((part) => part !== '').join('  ·  ');
  y = type.write(
    [...sender.lines, contact].filter((line) => line !== '').flatMap((line) => type.wrap(line, senderRoom, small)),
    paper.left,
    y,
    small,
  );

  let right = type.write([title], paper.right, top - 4, { size: 20 }, 'end');
  right = type.write(type.wrap(number, paper.width * 0.4, strong), paper.right, right, { ...strong, role: 'copper' }, 'end');

  paper.y = Math.max(y, right) + 20;
  const factsLeft = paper.left + paper.width * 0.58;
  const partyRoom = (factsLeft - paper.left - 20) / Math.max(1, parties.length) - 12;
  const below = parties.map(({ heading, party }, i) => {
    const x = paper.left + i * (partyRoom + 12);
    const named = type.write([heading], x, paper.y, small);
    const name = type.write(type.wrap(party.name, partyRoom, strong), x, named, strong);
    return type.write(
      party.lines.flatMap((line) => type.wrap(line, partyRoom, body)),
      x,
      name,
      body,
    );
  });
  paper.y = Math.max(...below, writeFacts(paper, facts, factsLeft)) + 18;
}

/** Facts as two columns; a long value wraps below itself. */
function writeFacts({ type, y: top, right }: Paper, facts: readonly Fact[], left: number): number {
  const nameRoom = Math.max(...facts.map(([name]) => type.width(name, small))) + 12;
  let y = top;
  for (const [name, value] of facts) {
    type.writeLine(name, left, y + 9.4, small);
    y = type.write(type.wrap(value, right - left - nameRoom, body), left + nameRoom, y, body) + 1.5;
  }
  return y;
}

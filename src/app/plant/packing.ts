/** A line on the packing list: how many units are left, whether it is ticked, and the count as typed. */
export interface PackedLine {
  line: string;
  left: number;
  packed?: boolean;
  quantity?: string;
}

/** What is wrong with the count of a ticked line; null where nothing is. */
export function quantityProblem({ left, packed, quantity = '' }: PackedLine): string | null {
  if (!packed) return null;
  const text = quantity.trim();
  if (!/^\d{1,5}$/.test(text) || Number(text) === 0) return `From 1 to ${left}.`;
  return Number(text) > left ? `Only ${left} ${left === 1 ? 'is' : 'are'} left.` : null;
}

/** Units ticked with a count that can be. */
export function packedUnits(lines: readonly PackedLine[]): number {
  return lines.reduce((sum, line) => (line.packed && quantityProblem(line) === null ? sum + Number(line.quantity) : sum), 0);
}

/** The lines to send out, or null while nothing is ticked or a count is wrong. */
export function toDispatch(lines: readonly PackedLine[]): { line: string; quantity: number }[] | null {
  const ticked = lines.filter(({ packed }) => packed);
  if (ticked.length === 0 || ticked.some((line) => quantityProblem(line) !== null)) return null;
  return ticked.map(({ line, quantity }) => ({ line, quantity: Number(quantity) }));
}

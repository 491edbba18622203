/** Something that wants to stand at `wanted` and takes `size` along the line. */
export interface Wanting {
  wanted: number;
  size: number;
}

/**
 * Places things along a line, each centred as near as can be to where it wants to stand, in
 * order of their wishes, without overlap, between `from` and `to`. Those that collide move
 * together as one block about their common middle. Where all of them need more room than
 * there is they run on past `to`.
 *
 * @returns the middle of each, in the order given
 */
export function spreadApart(things: readonly Wanting[], from: number, to: number): number[] {
  interface Block {
    start: number;
    size: number;
    members: number[];
  }
  const order = things.map((_, i) => i).sort((a, b) => things[a]!.wanted - things[b]!.wanted || a - b);
  const blocks: Block[] = [];
  const hold = (start: number, size: number) => Math.max(from, Math.min(start, to - size));
  const place = (members: number[]): Block => {
    const size = members.reduce((sum, i) => sum + things[i]!.size, 0);
    let before = 0;
    let starts = 0;
    for (const i of members) {
      starts += things[i]!.wanted - things[i]!.size / 2 - before;
      before += things[i]!.size;
    }
    return { start: hold(starts / members.length, size), size, members };
  };
  for (const i of order) {
    let block = place([i]);
    for (let last = blocks.at(-1); last && last.start + last.size > block.start; last = blocks.at(-1)) {
      blocks.pop();
      block = place([...last.members, ...block.members]);
    }
    blocks.push(block);
  }
  const middles = new Array<number>(things.length).fill(0);
  for (const { start, members } of blocks) {
    let at = start;
    for (const i of members) {
      middles[i] = at + things[i]!.size / 2;
      at += things[i]!.size;
    }
  }
  return middles;
}

import type { CircleItem, Item, TextItem } from '@shared/drawings/drawing';
import { textWidth } from '@shared/drawings/text-width';

/** The room an item takes on its sheet. */
export interface Box {
  left: number;
  top: number;
  right: number;
  bottom: number;
}

/** Lato's letters reach this far above and below the baseline, in sizes. */
const above = 0.74;
const below = 0.21;

export function boxOfText({ x, y, text, size, anchor, upward }: TextItem): Box {
  const length = textWidth(text, size);
  const start = { start: 0, middle: -length / 2, end: -length }[anchor];
  return upward
    ? { left: x - above * size, right: x + below * size, top: y - start - length, bottom: y - start }
    : { left: x + start, right: x + start + length, top: y - above * size, bottom: y + below * size };
}

export const boxOfCircle = ({ cx, cy, r }: CircleItem): Box => ({ left: cx - r, right: cx + r, top: cy - r, bottom: cy + r });

export const textsOf = (items: readonly Item[]): TextItem[] => items.filter((item) => item.kind === 'text');

export const touch = (a: Box, b: Box): boolean => a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom;

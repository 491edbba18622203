import { type OrderState } from '@shared/contracts/orders';
import { Refusal } from '@shared/contracts/problems';
import { type Role } from '@shared/contracts/session';

/** One allowed move of an order: who may make it, and what it writes beside the move itself. */
export interface AllowedMove {
  from: OrderState;
  to: OrderState;
  /** as it stands on the button */
  label: string;
  who: readonly Role[];
  needsReason: boolean;
  /** `dispatch`: only the dispatch of the last unit makes it */
  by: 'person' | 'dispatch';
  /** refused once a unit has been dispatched: its invoice stands */
  beforeDispatch?: true;
  /**
   * `check`: credit is checked now, and the order goes to credit review instead where it does
   * not reach; `take`: the order's total is reserved; `free`: the reservation is given back.
   */
  credit?: 'check' | 'take' | 'free';
}

const dealer = ['buyer', 'dealer-admin'] as const;
const sales = ['sales', 'fabricator-admin'] as const;
const clerks = ['accounts', 'fabricator-admin'] as const;
const plant = ['plant', 'fabricator-admin'] as const;

const approve = { label: 'Approve', who: ['dealer-admin'], needsReason: false, by: 'person', credit: 'check' } as const;
const refuse = { to: 'refused', label: 'Refuse', needsReason: true, by: 'person' } as const;
const cancel = { to: 'cancelled', label: 'Cancel order', who: [...dealer, ...sales], needsReason: true, by: 'person' } as const;
const lastUnit = { to: 'dispatched', label: 'Dispatch', who: plant, needsReason: false, by: 'dispatch' } as const;

/**
 * The life of an order: every move there is; any other is refused. Credit is reserved while an
 * order on account is submitted, accepted, in production or ready; an order that waits for
 * approval or review holds none, so nobody's credit is bound by what may never be made.
 */
export const allowedMoves: readonly AllowedMove[] = [
  { from: 'awaiting approval', to: 'submitted', ...approve },
  { from: 'awaiting approval', ...refuse, who: ['dealer-admin'] },
  { from: 'awaiting approval', ...cancel, who: dealer },
  { from: 'credit review', to: 'submitted', label: 'Release', who: clerks, needsReason: false, by: 'person', credit: 'take' },
  { from: 'credit review', ...refuse, who: clerks },
  { from: 'credit review', ...cancel },
  { from: 'submitted', to: 'accepted', label: 'Accept', who: sales, needsReason: false, by: 'person' },
  { from: 'submitted', ...refuse, who: sales, credit: 'free' },
  { from: 'submitted', ...cancel, credit: 'free' },
  { from: 'accepted', to: 'in production', label: 'Start production', who: plant, needsReason: false, by: 'person' },
  { from: 'accepted', ...cancel, credit: 'free', beforeDispatch: true },
  { from: 'accepted', ...lastUnit },
  { from: 'in production', to: 'ready', label: 'Mark as ready', who: plant, needsReason: false, by: 'person' },
  { from: 'in production', ...lastUnit },
  { from: 'ready', ...lastUnit },
  { from: 'dispatched', to: 'delivered', label: 'Confirm delivery', who: [...plant, ...dealer], needsReason: false, by: 'person' },
  {
    from: 'delivered',
    to: 'closed',
    label: 'Close',
    who: ['sales', 'accounts', 'plant', 'fabricator-admin'],
    needsReason: false,
    by: 'person',
  },
];

/** Where an order of this state and with these units out stands. */
export interface Standing {
  state: OrderState;
  dispatchedUnits: number;
}

const holdsOne = (held: readonly Role[], wanted: readonly Role[]) => held.some((role) => wanted.includes(role));
const isOpen = (move: AllowedMove, { dispatchedUnits }: Standing) => !(move.beforeDispatch && dispatchedUnits > 0);

/** The moves that someone with these roles may make now. */
export function movesOpenTo(standing: Standing, held: readonly Role[]): AllowedMove[] {
  return allowedMoves.filter(
    (move) => move.from === standing.state && move.by === 'person' && isOpen(move, standing) && holdsOne(held, move.who),
  );
}

/** Whether units can be dispatched in this state. */
export function canDispatchIn(state: OrderState): boolean {
  return allowedMoves.some((move) => move.from === state && move.by === 'dispatch');
}

/** Whether someone with these roles may dispatch units of the order now. */
export function mayDispatch({ state }: Standing, held: readonly Role[]): boolean {
  return canDispatchIn(state) && holdsOne(held, plant);
}

/** The move asked for, or why not: 409 outside the table, 403 for another role, 422 without the reason it needs. */
export function judgeMove(standing: Standing, to: OrderState, reason: string | undefined, held: readonly Role[]): AllowedMove | Refusal {
  const move = allowedMoves.find((allowed) => allowed.from === standing.state && allowed.to === to);
  if (!move) return new Refusal('not-in-this-state', `An order that is ${standing.state} cannot become ${to}.`);
  if (!holdsOne(held, move.who)) return new Refusal('not-allowed', `This move is for ${move.who.join(', ')}.`);
  if (move.by === 'dispatch') return new Refusal('not-in-this-state', 'An order becomes dispatched when its last unit is dispatched.');
  if (!isOpen(move, standing)) return new Refusal('not-in-this-state', 'Units of this order have been dispatched and invoiced.');
  if (move.needsReason && !reason) {
    return new Refusal('invalid', 'Say why.', [{ pointer: '/reason', detail: 'this move needs a reason' }]);
  }
  return move;
}

import { type ProblemCode } from '@shared/contracts/problems';

/** What a credit check reads of an account, in minor units of its currency. */
export interface CreditState {
  limitMinor: number;
  /** open receivables */
  receivableMinor: number;
  /** orders on account, placed and not yet invoiced, with tax and delivery */
  reservedMinor: number;
  unappliedMinor: number;
  onHold: boolean;
  /** open on invoices overdue beyond the account's grace days */
  overdueBeyondGraceMinor: number;
  countsFrom: 'placement' | 'dispatch';
}

/** Open receivables + orders not yet invoiced − unapplied cash. */
export function exposureMinor(state: Pick<CreditState, 'receivableMinor' | 'reservedMinor' | 'unappliedMinor'>): number {
  return state.receivableMinor + state.reservedMinor - state.unappliedMinor;
}

/** Limit − exposure; below zero when the account is over its limit. */
export function availableMinor(state: Pick<CreditState, 'limitMinor' | 'receivableMinor' | 'reservedMinor' | 'unappliedMinor'>): number {
  return state.limitMinor - exposureMinor(state);
}

export type CreditAnswer =
  | { ok: true }
  | { ok: false; code: Extract<ProblemCode, 'account-on-hold' | 'overdue' | 'over-credit'>; availableMinor: number; shortByMinor: number };

/**
 * Whether an order of this total may be placed on account: not on hold, nothing overdue beyond
 * the grace days, and room within the limit. Where the account counts from dispatch, the order
 * takes no room yet and passes whatever its size; `checkDispatch` holds each part of it.
 */
export function checkPlacement(state: CreditState, totalMinor: number): CreditAnswer {
  const shortByMinor = state.countsFrom === 'placement' ? Math.max(0, totalMinor - availableMinor(state)) : 0;
  if (state.onHold) return refuse('account-on-hold', state, shortByMinor);
  if (state.overdueBeyondGraceMinor > 0) return refuse('overdue', state, shortByMinor);
  return shortByMinor > 0 ? refuse('over-credit', state, shortByMinor) : { ok: true };
}

/**
 * Whether an invoice of this total finds room when its goods leave. An account that counts
 * from placement has reserved the room before, and a person may have released it above the
 * limit; so nothing is asked of it again.
 */
export function checkDispatch(state: CreditState, totalMinor: number): CreditAnswer {
  const shortByMinor = state.countsFrom === 'dispatch' ? Math.max(0, totalMinor - availableMinor(state)) : 0;
  return shortByMinor > 0 ? refuse('over-credit', state, shortByMinor) : { ok: true };
}

function refuse(code: 'account-on-hold' | 'overdue' | 'over-credit', state: CreditState, shortByMinor: number): CreditAnswer {
  return { ok: false, code, availableMinor: availableMinor(state), shortByMinor };
}

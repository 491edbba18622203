import { orderStates } from '@shared/contracts/orders';
import { Refusal } from '@shared/contracts/problems';
import { roles, type Role } from '@shared/contracts/session';
import { allowedMoves, canDispatchIn, judgeMove, mayDispatch, movesOpenTo } from './order-life';
import { reservedMinorOf } from './reservation';

const at = (state: (typeof orderStates)[number], dispatchedUnits = 0) => ({ state, dispatchedUnits });
const codeOf = (answer: unknown) => (answer instanceof Refusal ? answer.code : 'allowed');

describe('the life of an order', () => {
  it('judges every pair of states for every role by the table alone', () => {
    for (const from of orderStates) {
      for (const to of orderStates) {
        const row = allowedMoves.find((move) => move.from === from && move.to === to);
        for (const role of roles) {
          const answer = codeOf(judgeMove(at(from), to, 'because', [role]));
          const expected = !row || row.by === 'dispatch' ? 'not-in-this-state' : row.who.includes(role) ? 'allowed' : 'not-allowed';
          if (row?.by === 'dispatch' && !row.who.includes(role)) expect(answer).toBe('not-allowed');
          else expect([from, to, role, answer]).toEqual([from, to, role, expected]);
        }
      }
    }
  });

  it('lets nobody out of an ended order', () => {
    for (const state of ['closed', 'cancelled', 'refused'] as const) {
      expect(movesOpenTo(at(state), roles)).toEqual([]);
      expect(canDispatchIn(state)).toBe(false);
    }
  });

  it.each<[from: (typeof orderStates)[number], role: Role, to: string[]]>([
    ['awaiting approval', 'buyer', ['cancelled']],
    ['awaiting approval', 'dealer-admin', ['submitted', 'refused', 'cancelled']],
    ['awaiting approval', 'sales', []],
    ['credit review', 'accounts', ['submitted', 'refused']],
    ['credit review', 'sales', ['cancelled']],
    ['submitted', 'sales', ['accepted', 'refused', 'cancelled']],
    ['submitted', 'buyer', ['cancelled']],
    ['submitted', 'plant', []],
    ['accepted', 'plant', ['in production']],
    ['accepted', 'buyer', ['cancelled']],
    ['in production', 'buyer', []],
    ['in production', 'plant', ['ready']],
    ['ready', 'plant', []],
    ['dispatched', 'buyer', ['delivered']],
    ['delivered', 'buyer', []],
    ['delivered', 'sales', ['closed']],
  ])('offers in %s to %s: %j', (state, role, to) => {
    expect(movesOpenTo(at(state), [role]).map((move) => move.to)).toEqual(to);
  });

  it('asks for the reason of a refusal or cancellation, at its field', () => {
    const answer = judgeMove(at('submitted'), 'refused', undefined, ['sales']);
    expect(answer).toBeInstanceOf(Refusal);
    expect((answer as Refusal).errors).toEqual([{ pointer: '/reason', detail: 'this move needs a reason' }]);
  });

  it('keeps an order from being cancelled once a unit is out', () => {
    expect(codeOf(judgeMove(at('accepted', 1), 'cancelled', 'changed', ['buyer']))).toBe('not-in-this-state');
    expect(movesOpenTo(at('accepted', 1), ['buyer'])).toEqual([]);
    expect(codeOf(judgeMove(at('accepted', 0), 'cancelled', 'changed', ['buyer']))).toBe('allowed');
  });

  it('dispatches from accepted on, by the plant alone', () => {
    expect(orderStates.filter(canDispatchIn)).toEqual(['accepted', 'in production', 'ready']);
    expect(mayDispatch(at('ready'), ['plant'])).toBe(true);
    expect(mayDispatch(at('ready'), ['sales', 'accounts', 'buyer', 'dealer-admin'])).toBe(false);
  });

  it('says of each move what becomes of the reservation, as the states have it', () => {
    const reserved = (state: (typeof orderStates)[number]) =>
      reservedMinorOf({ state, payment: 'account', totalMinor: 100, invoicedMinor: 0 }, 'placement');
    for (const move of allowedMoves.filter(({ by }) => by === 'person')) {
      const change = reserved(move.to) - reserved(move.from);
      const expected = move.credit === 'check' || move.credit === 'take' ? 100 : move.credit === 'free' ? -100 : 0;
      expect([move.from, move.to, change]).toEqual([move.from, move.to, expected]);
    }
  });
});

import { judgeRequiredDay, promisedDay } from './promised-day';

const calendar = {
  workingDays: [1, 2, 3, 4, 5],
  closed: ['2026-11-26'],
  leadTimes: [
    { class: 'usual', name: 'Usual', workingDays: 8 },
    { class: 'rush', name: 'Rush', workingDays: 3 },
  ],
};

describe('the day an order is promised for', () => {
  it('counts working days of the plant after the day of the order', () => {
    // Tuesday 24 November 2026: Wednesday, then Friday (closed on Thursday), then Monday.
    expect(promisedDay('2026-11-24', 'rush', calendar)).toBe('2026-11-30');
    expect(promisedDay('2026-11-24', null, calendar)).toBe('2026-12-07');
  });

  it('takes the usual lead time where the class is no longer offered', () => {
    expect(promisedDay('2026-11-24', 'overnight', calendar)).toBe(promisedDay('2026-11-24', 'usual', calendar));
  });

  it('refuses a required day that is too early or not worked, naming the nearest that would do', () => {
    expect(judgeRequiredDay('2026-12-04', '2026-12-07', calendar)).toEqual({
      pointer: '/requiredOn',
      detail: 'the earliest day is 2026-12-07',
    });
    expect(judgeRequiredDay('2026-12-12', '2026-12-07', calendar)?.detail).toContain('2026-12-14');
    expect(judgeRequiredDay('2026-12-07', '2026-12-07', calendar)).toBeNull();
  });
});

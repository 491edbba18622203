import { computed, signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { of, Subject, throwError } from 'rxjs';
import { loaded } from './loaded';
import { ProblemError } from './problem-error';

const inContext = <T>(make: () => T): T => TestBed.runInInjectionContext(make);

describe('what is read from the server', () => {
  it('shows nothing of one thing while another is being read', () => {
    const wanted = signal('a');
    const answers = new Map([
      ['a', new Subject<string>()],
      ['b', new Subject<string>()],
    ]);
    const thing = inContext(() => loaded(wanted, (id) => answers.get(id)!));
    TestBed.tick();
    answers.get('a')!.next('answer a');
    expect(thing.value()).toBe('answer a');

    wanted.set('b');
    expect(thing.value()).toBeUndefined();
    TestBed.tick();
    expect(thing.value()).toBeUndefined();
    answers.get('b')!.next('answer b');
    expect(thing.value()).toBe('answer b');
  });

  it('keeps what a change answered on the screen while it is read again', () => {
    const replies = [new Subject<string>(), new Subject<string>()];
    let calls = 0;
    const thing = inContext(() => loaded(signal('a'), () => replies[calls++]!));
    TestBed.tick();
    replies[0]!.next('first');
    thing.set('changed');
    expect(thing.value()).toBe('changed');

    thing.reload();
    expect(thing.value()).toBe('changed');
    TestBed.tick();
    expect(thing.value()).toBe('changed');
    replies[1]!.next('second');
    expect(thing.value()).toBe('second');
  });

  it('says why it was refused, and shows nothing then', () => {
    const refusal = new ProblemError(404, 'not-found', 'There is no such thing.', [], {});
    const thing = inContext(() => loaded(signal('a'), () => throwError(() => refusal)));
    TestBed.tick();
    expect(thing.value()).toBeUndefined();
    expect(thing.problem()).toBe(refusal);
  });

  it('reads nothing without a request', () => {
    const read = jest.fn(() => of('x'));
    const thing = inContext(() =>
      loaded(
        computed(() => undefined),
        read,
      ),
    );
    TestBed.tick();
    expect(read).not.toHaveBeenCalled();
    expect(thing.value()).toBeUndefined();
  });
});

import { Component, signal } from '@angular/core';
import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { type MeasureSystem } from '@shared/measures/parse-length';
import { LengthField } from './length-field';

@Component({
  imports: [LengthField],
  template: `<app-length-field label="Width" [system]="system()" [zero]="zero()" [(text)]="text" (entered)="entered = entered + 1" />`,
})
class Host {
  readonly system = signal<MeasureSystem>('imperial');
  readonly zero = signal(false);
  readonly text = signal('36 1/2');
  entered = 0;
}

let fixture: ComponentFixture<Host>;
let input: HTMLInputElement;

async function type(text: string): Promise<void> {
  input.value = text;
  input.dispatchEvent(new Event('input'));
  await fixture.whenStable();
}
const press = (key: string, init: KeyboardEventInit = {}) =>
  input.dispatchEvent(new KeyboardEvent('keydown', { key, cancelable: true, ...init }));
const host = () => fixture.nativeElement as HTMLElement;
const beside = () => host().querySelector('.beside')!.textContent!.replace(/\s+/g, ' ').trim();
const error = () => host().querySelector('mat-error')?.textContent ?? null;

describe('LengthField', () => {
  beforeEach(async () => {
    fixture = TestBed.createComponent(Host);
    await fixture.whenStable();
    input = host().querySelector('input')!;
  });

  it('shows the text as it was typed, its unit and the other measure', async () => {
    expect(input.value).toBe('36 1/2');
    expect(beside()).toBe('in 927.1 mm');
    await type('36-1/2"');
    expect(beside()).toBe('927.1 mm');
    await type('927 mm');
    expect(beside()).toBe('≈ 36 1/2 in');
    expect(fixture.componentInstance.text()).toBe('927 mm');
  });

  it('has its label, and is described by what stands beside it', () => {
    expect(host().querySelector(`label[for="${input.id}"]`)?.textContent).toContain('Width');
    const described = input
      .getAttribute('aria-describedby')!
      .split(' ')
      .map((id) => host().querySelector(`#${id}`)?.textContent?.trim());
    expect(described.join()).toContain('927.1 mm');
  });

  it('waits with its message for a pause or until one leaves', async () => {
    await type('36 1/');
    expect(error()).toBeNull();
    input.dispatchEvent(new Event('blur'));
    await fixture.whenStable();
    expect(error()).toContain('is not a size');
    expect(input.getAttribute('aria-invalid')).toBe('true');
    await type('36 1/4');
    expect(error()).toBeNull();
    expect(input.getAttribute('aria-invalid')).toBe('false');
  });

  it('says what is wrong after a pause', async () => {
    jest.useFakeTimers();
    input.value = '0';
    input.dispatchEvent(new Event('input'));
    fixture.detectChanges();
    expect(error()).toBeNull();
    jest.advanceTimersByTime(1000);
    fixture.detectChanges();
    expect(error()).toBe('A size must be above zero.');
    jest.useRealTimers();
  });

  it('takes zero where zero is a length', async () => {
    fixture.componentInstance.zero.set(true);
    await type('0');
    input.dispatchEvent(new Event('blur'));
    await fixture.whenStable();
    expect(error()).toBeNull();
    expect(beside()).toBe('in 0 mm');
  });

  it.each([
    ['ArrowUp', false, '36 9/16'],
    ['ArrowDown', false, '36 7/16'],
    ['ArrowUp', true, '38'],
    ['ArrowDown', true, '36'],
  ] as const)('steps: %s, shift %s', async (key, shiftKey, expected) => {
    press(key, { shiftKey });
    await fixture.whenStable();
    expect(fixture.componentInstance.text()).toBe(expected);
    expect(input.value).toBe(expected);
  });

  it('steps in the measures the text is written in', async () => {
    await type('927.4 mm');
    press('ArrowUp');
    expect(fixture.componentInstance.text()).toBe('928 mm');
  });

  it('lets Enter through once, with a size that can be read', async () => {
    press('Enter');
    press('Enter', { repeat: true });
    expect(fixture.componentInstance.entered).toBe(1);
    await type('wide');
    press('Enter');
    await fixture.whenStable();
    expect(fixture.componentInstance.entered).toBe(1);
    expect(error()).toContain('is not a size');
  });
});

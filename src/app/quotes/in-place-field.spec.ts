import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { InPlaceField } from './in-place-field';

describe('InPlaceField', () => {
  let fixture: ComponentFixture<InPlaceField>;
  let save: jest.Mock<Promise<string | null>, [string]>;
  const input = () => (fixture.nativeElement as HTMLElement).querySelector('input')!;
  const reason = () => (fixture.nativeElement as HTMLElement).querySelector('.reason')?.textContent;
  const type = (text: string) => {
    input().value = text;
    input().dispatchEvent(new Event('input'));
  };
  const press = (key: string) => input().dispatchEvent(new KeyboardEvent('keydown', { key }));
  const leave = () => input().dispatchEvent(new FocusEvent('blur'));

  beforeEach(async () => {
    save = jest.fn<Promise<string | null>, [string]>(async () => null);
    fixture = TestBed.createComponent(InPlaceField);
    fixture.componentRef.setInput('label', 'Units of Bay');
    fixture.componentRef.setInput('value', '6');
    fixture.componentRef.setInput('save', save);
    await fixture.whenStable();
  });

  it('saves once with Enter, also when the field is left meanwhile', async () => {
    type(' 7 ');
    press('Enter');
    leave();
    await fixture.whenStable();
    expect(save.mock.calls).toEqual([['7']]);
  });

  it('saves nothing where nothing was changed', async () => {
    type('6');
    leave();
    await fixture.whenStable();
    expect(save).not.toHaveBeenCalled();
  });

  it('takes the saved value over as it is written now', async () => {
    save.mockImplementation(async () => {
      fixture.componentRef.setInput('value', '36 1/2');
      return null;
    });
    type('36.5');
    leave();
    await fixture.whenStable();
    expect(input().value).toBe('36 1/2');
  });

  it('keeps what could not be saved, says why, and sends it again with Enter alone', async () => {
    save.mockResolvedValue('A whole number from 1 to 10 000.');
    type('0');
    press('Enter');
    await fixture.whenStable();
    expect(input().value).toBe('0');
    expect(reason()).toBe('A whole number from 1 to 10 000.');
    expect(input().getAttribute('aria-invalid')).toBe('true');
    leave();
    await fixture.whenStable();
    expect(save).toHaveBeenCalledTimes(1);
    press('Enter');
    await fixture.whenStable();
    expect(save).toHaveBeenCalledTimes(2);
  });

  it('puts the saved value back with Escape', async () => {
    save.mockResolvedValue('No.');
    type('0');
    leave();
    await fixture.whenStable();
    press('Escape');
    await fixture.whenStable();
    expect(input().value).toBe('6');
    expect(reason()).toBeUndefined();
  });

  it('does not take from under the hands what one is typing', async () => {
    type('66');
    fixture.componentRef.setInput('value', '8');
    await fixture.whenStable();
    expect(input().value).toBe('66');
  });
});

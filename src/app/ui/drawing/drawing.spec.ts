import { TestBed } from '@angular/core/testing';
import { elevation } from '@shared/drawings/elevation';
import { section } from '@shared/drawings/section';
import { catalogueFactory, unitFactory } from '../../../../test/factories/catalogue-factory';
import { Drawing } from './drawing';

const catalogue = catalogueFactory();
const pictures = [
  elevation(unitFactory(), catalogue, { system: 'imperial', tag: '<b>Bay & "left"</b>' }),
  section(unitFactory(), catalogue, { system: 'imperial' }),
];

function render(index: number): HTMLElement {
  const fixture = TestBed.createComponent(Drawing);
  fixture.componentRef.setInput('drawing', pictures[index]);
  fixture.detectChanges();
  return fixture.nativeElement as HTMLElement;
}

describe('Drawing', () => {
  it('is an image with a name and a description', () => {
    const svg = render(1).querySelector('svg')!;
    expect(svg.getAttribute('role')).toBe('img');
    const named = (attribute: string) => svg.querySelector(`#${svg.getAttribute(attribute)}`)?.textContent;
    expect(named('aria-labelledby')).toBe('Section through the edge');
    expect(named('aria-describedby')).toContain('from outside in: lite 1');
  });

  it('draws every item, in roles of the theme', () => {
    const svg = render(1).querySelector('svg')!;
    const drawn = svg.querySelectorAll(':scope > :is(path, line, rect, circle, text)');
    expect(drawn).toHaveLength(pictures[1]!.items.length);
    expect(svg.querySelector('path')!.getAttribute('fill')).toBe('var(--sy-glass)');
    expect(svg.innerHTML).not.toMatch(/#[0-9a-f]{6}|undefined|NaN/);
  });

  it('gives each drawing its own pattern ids, and fills point at them', () => {
    const first = render(1);
    const second = render(1);
    const ids = [first, second].map((host) => [...host.querySelectorAll('pattern')].map(({ id }) => id));
    expect(ids[0]).toHaveLength(2);
    expect(new Set(ids.flat()).size).toBe(4);
    for (const [i, host] of [first, second].entries()) {
      const used = [...host.innerHTML.matchAll(/url\(#([\w-]+)\)/g)].map(([, id]) => id);
      expect(new Set(used)).toEqual(new Set(ids[i]));
    }
  });

  it('writes a tag as text, never as markup', () => {
    const host = render(0);
    expect(host.querySelector('b')).toBeNull();
    expect([...host.querySelectorAll('text')].map((text) => text.textContent)).toContain('<b>Bay & "left"</b>');
  });

  it('shares a row in proportion to its width', () => {
    expect(render(0).style.flex).toBe('230 1 0px');
  });
});

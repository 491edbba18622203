import AxeBuilder from '@axe-core/playwright';
import { type Page } from 'playwright-core';
import { type Screen } from './screens';
import { DESK, PHONE } from './sitting';
import { visit } from './visit';

/** WCAG 2.2 up to AA, as axe-core names it. */
const AA = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'];

/** What axe finds on the page as it stands, a line each; `rules` instead of all that are AA. */
async function axe(page: Page, where: string, rules?: string[]): Promise<string[]> {
  // Legacy mode runs in the page itself; the other is for frames, and there are none.
  const builder = new AxeBuilder({ page }).setLegacyMode(true);
  const { violations } = await (rules ? builder.withRules(rules) : builder.withTags(AA)).analyze();
  return violations.flatMap(({ id, help, nodes }) =>
    nodes.map(({ target, failureSummary }) => `${where}: ${id}, ${help}: ${target.join(' ')} (${failureSummary?.replace(/\s+/g, ' ')})`),
  );
}

/** How far the page is wider than its window at this width, as a finding. */
async function overflow(page: Page, width: number): Promise<string[]> {
  await page.setViewportSize({ ...PHONE, width });
  const { wide, culprits } = await page.evaluate(() => {
    const window = document.documentElement.clientWidth;
    const sticksOut = (element: Element) => element.getBoundingClientRect().right > window + 1;
    const name = (element: Element) => `${element.tagName.toLowerCase()}.${[...element.classList].join('.')}`;
    return {
      wide: document.documentElement.scrollWidth - window,
      culprits: [...document.querySelectorAll('body *')].filter(sticksOut).slice(0, 4).map(name),
    };
  });
  return wide > 0 ? [`${width} px: ${wide} px too wide: ${culprits.join(', ')}`] : [];
}

/**
 * Everything found wrong with a screen: axe at a desk and on a phone, contrast in the dark scheme,
 * where nothing but the colours is another, and pages wider than a phone.
 */
export async function findingsOn(page: Page, screen: Screen): Promise<string[]> {
  await page.setViewportSize(DESK);
  await page.emulateMedia({ colorScheme: 'light' });
  await visit(page, screen);
  const found = await axe(page, 'desk');
  await page.emulateMedia({ colorScheme: 'dark' });
  found.push(...(await axe(page, 'desk, dark', ['color-contrast'])));
  found.push(...(await overflow(page, 320)), ...(await overflow(page, PHONE.width)));
  found.push(...(await axe(page, 'phone, dark')));
  await page.emulateMedia({ colorScheme: 'light' });
  return found;
}

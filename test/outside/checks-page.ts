import type { Check } from './check';

/** The page that lists every check with what we get, as Markdown. */
export function checksPage(subjects: readonly { subject: string; checks: readonly Check[] }[]): string {
  const count = subjects.reduce((sum, { checks }) => sum + checks.length, 0);
  const parts = subjects.map(({ subject, checks }) =>
    [
      `## ${subject}`,
      '',
      '| check | source | how sure | expected | ours | difference | allowed |',
      '| --- | --- | --- | ---: | ---: | ---: | ---: |',
      ...checks.map(({ what, source, mark, expected, tolerance, ours }) => {
        const value = ours();
        return `| ${[what, source, mark, digits(expected), digits(value), difference(value - expected, tolerance), tolerance === 0 ? 'none' : digits(tolerance)].join(' | ')} |`;
      }),
      '',
    ].join('\n'),
  );
  return [
    '# Glazing engineering against values from outside',
    '',
    'Written by `npm run docs:checks`; a test fails when it is out of date.',
    '',
    `${count} checks. *Published*: read in a published copy. *From memory*: recalled, and agreeing with an independent`,
    'calculation. *Calculated*: from the formula of the source. *Another way*: by another program or numerical method.',
    'The rules of safety glazing (IRC R308.4) are held row by row in `shared/glazing/safety-glazing.spec.ts`.',
    '',
    ...parts,
  ].join('\n');
}

function digits(value: number): string {
  return String(Number(value.toPrecision(6)));
}

/** A difference far below what is allowed is the noise of binary numbers, and another machine's noise is another. */
function difference(value: number, tolerance: number): string {
  return Math.abs(value) < Math.max(tolerance / 1000, 1e-12) ? '0' : String(Number(value.toPrecision(2)));
}

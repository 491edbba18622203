import { pathToFileURL } from 'node:url';
import { setFlagsFromString } from 'node:v8';
import { runInNewContext } from 'node:vm';
import { type PriceListVersion } from '@shared/contracts/price-lists';
import { priceLines } from '@api/pricing/engine/price-lines';
import { type LineToPrice, priceUnit } from '@api/pricing/engine/price-unit';
import { weighUnit } from '@api/pricing/engine/measure-line';
import { catalogueFactory, unitFactory } from '../factories/catalogue-factory';
import { everydaySpread, lineFactory } from '../factories/line-factory';
import { priceListFactory, priceTermsFactory } from '../factories/price-list-factory';
import { priceWorkbook } from '../outside/pricing/price-workbook';
import { bareDecimals } from './bare-decimals';
import { type Measure, median } from './measure';

/**
 * How fast the engine prices, beside a spreadsheet of the same list and beside bare decimal
 * arithmetic. Times are processor time of this process, so that other work on the machine counts
 * little; what is compared takes turns, after a warm-up, and the medians are compared.
 */

const catalogue = catalogueFactory();
const terms = priceTermsFactory();
const many = 10_000;

export function measurePricing(): Promise<Measure[]> {
  // The spreadsheet comes last: what it leaves on the heap would weigh on the others.
  const alone = [besideBareDecimals(), byNumberOfLines()];
  return Promise.resolve([...besideSpreadsheet(), ...alone]);
}

/** The weight is given to both sides: it is engineering, not pricing. */
function weighed(lines: readonly LineToPrice[]): LineToPrice[] {
  return lines.map((line) => {
    const found = weighUnit(line.unit, catalogue);
    if ('refusals' in found) throw new Error(JSON.stringify(found.refusals));
    return { ...line, weightKg: found.weightKg };
  });
}

function besideSpreadsheet(): Measure[] {
  const { content } = priceListFactory();
  const lines = weighed(lineFactory(content, many, 2026));
  const dearer = (step: number): PriceListVersion => {
    const assembly = content.assembly.map((row) => (row.cavity === 1 ? { ...row, rate: (3.41 + step / 100).toFixed(2) } : row));
    return priceListFactory({ ...structuredClone(content), assembly }, { version: `northmere.${4 + step}` });
  };
  const engineRuns = (count: number) =>
    Array.from({ length: count }, (_, step) => {
      const list = dearer(step);
      return spent(() => priceLines(lines, list, terms, catalogue));
    });

  const takingIn: number[] = [];
  const recalculating: number[] = [];
  const engine: number[] = [];
  engineRuns(5);
  for (let round = 0; round < 2; round += 1) {
    collectGarbage();
    engine.push(...engineRuns(7));
    collectGarbage();
    let workbook: ReturnType<typeof priceWorkbook> | undefined;
    takingIn.push(spent(() => (workbook = priceWorkbook(content, terms, lines, false))));
    const { book, rateOf } = workbook!;
    for (let step = 0; step < 6; step += 1) {
      const recalculated = spent(() => book.setCellContents(rateOf('Assembly', 0), 3.41 + step / 100));
      if (step > 0) recalculating.push(recalculated);
    }
    book.destroy();
  }
  const perSecond = (ms: number) => `${Math.round(many / (ms / 1000)).toLocaleString('en-GB')} lines/s`;
  const [ours, recalculated, takenIn] = [median(engine), median(recalculating), median(takingIn)];
  const how = `${many} lines of ${everydaySpread.makeUps} make-ups at random sizes, a new version each time; ours ${perSecond(ours)}`;
  return [
    {
      measure: 'price lines a second, whole charge sheets ÷ HyperFormula recalculating after a rate changes',
      ratio: (recalculated / ours).toFixed(1),
      toReach: '≥ 5',
      reached: recalculated / ours >= 5,
      detail: `${how}; HyperFormula 3.5.0 ${perSecond(recalculated)}, the rate of the first cavity, which every line has, changed`,
    },
    {
      measure: 'the same ÷ HyperFormula taking the lines in',
      ratio: (takenIn / ours).toFixed(1),
      toReach: '≥ 20',
      reached: takenIn / ours >= 20,
      detail: `${how}; HyperFormula ${perSecond(takenIn)}, formulas only for what a line has`,
    },
  ];
}

function besideBareDecimals(): Measure {
  const list = priceListFactory();
  const unit = unitFactory();
  const line = { unit, quantity: 6, weightKg: '17.992' };
  const answer = priceUnit(line, list, terms, catalogue);
  if ('refusals' in answer || answer.priced.unitPriceMinor !== bareDecimals(unit.width, unit.height, line.weightKg)) {
    throw new Error('the bare arithmetic does not price the worked example');
  }
  const times = 4000;
  const priceMany = () => spent(() => repeat(times, () => priceUnit(line, list, terms, catalogue)));
  const bareMany = () => spent(() => repeat(times, () => bareDecimals(unit.width, unit.height, line.weightKg)));
  repeat(5, () => [priceMany(), bareMany()]);
  const rounds = Array.from({ length: 41 }, () => ({ priced: priceMany(), bare: bareMany() }));
  const [priced, bare] = [median(rounds.map((round) => round.priced)), median(rounds.map((round) => round.bare))];
  const each = (ms: number) => `${((ms / times) * 1000).toFixed(1)} µs`;
  return {
    measure: 'time of one cold priced line ÷ the bare decimal.js operations that it cannot do without',
    ratio: (priced / bare).toFixed(2),
    toReach: '≤ 1.5',
    reached: priced / bare <= 1.5,
    detail: `the worked example, ${each(priced)} with terms and whole sheet, the list compiled, the weight given, nothing kept of the line; bare ${each(bare)}, each distinct amount made once`,
  };
}

function byNumberOfLines(): Measure {
  const list = priceListFactory();
  const counts = [10, 100, 1000, many];
  const lines = weighed(lineFactory(list.content, many, 77));
  const costs = counts.map((): number[] => []);
  for (let round = -1; round < 15; round += 1) {
    counts.forEach((count, i) => {
      // The same ten thousand lines at every count, cut into batches of so many.
      const took = spent(() => {
        for (let from = 0; from < many; from += count) priceLines(lines.slice(from, from + count), list, terms, catalogue);
      });
      if (round >= 0) costs[i]!.push(took);
    });
  }
  const perLine = costs.map((took) => (median(took) / many) * 1000);
  const growth = Math.max(...perLine.flatMap((later, j) => perLine.slice(0, j).map((earlier) => later / earlier)));
  return {
    measure: 'cost per line at 10, 100, 1 000, 10 000 lines: most that it grows from fewer to more',
    ratio: growth.toFixed(2),
    toReach: '≤ 1.2',
    reached: growth <= 1.2,
    detail: `${perLine.map((cost) => cost.toFixed(1)).join(', ')} µs; it may fall, for more lines share more billed sizes`,
  };
}

function repeat(times: number, work: () => unknown): void {
  for (let i = 0; i < times; i += 1) work();
}

/** Processor time of `work` in milliseconds. */
function spent(work: () => void): number {
  const before = process.cpuUsage();
  work();
  const { user, system } = process.cpuUsage(before);
  return (user + system) / 1000;
}

/** A workbook of a gigabyte that is no longer used must not slow down what is measured next. */
function collectGarbage(): void {
  setFlagsFromString('--expose-gc');
  (runInNewContext('gc') as () => void)();
}

if (process.argv[1] !== undefined && import.meta.url === pathToFileURL(process.argv[1]).href) console.table(await measurePricing());

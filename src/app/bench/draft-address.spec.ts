import fc from 'fast-check';
import { exact } from '@shared/money/exact';
import { catalogueFactory } from '../../../test/factories/catalogue-factory';
import { lengthText } from '../ui/read-length';
import { type Draft, emptyPlace, firstDraft, readDraft } from './draft';
import { decodeDraft, type DraftAddress, encodeDraft } from './draft-address';
import { rewriteDraft } from './rewrite-draft';

const catalogue = catalogueFactory();
const ids = (items: readonly { id: string }[]) => fc.constantFrom(...items.map(({ id }) => id));

/** Through the address bar and back: names and values as a query string. */
function reopen(address: DraftAddress, system: Draft['system']) {
  const query = new URLSearchParams(Object.entries(address).flatMap(([name, value]) => (value === null ? [] : [[name, value]])));
  return decodeDraft((name) => new URLSearchParams(query.toString()).get(name), system, catalogue);
}

const sixteenths = fc.integer({ min: 1, max: 60_000 }).map((n) => exact(String(n)).times('1.5875').toFixed());
const hundredths = fc.integer({ min: 1, max: 9_000_000 }).map((n) => exact(String(n)).dividedBy(100).toFixed());
const length = fc.oneof(sixteenths, hundredths);
const answers = fc.option(fc.boolean(), { nil: undefined });

const layers = fc.integer({ min: 2, max: 4 }).chain((count) =>
  fc.record({
    lites: fc.tuple(
      ...Array.from({ length: count }, (_, i) =>
        fc.record(
          {
            glass: ids(catalogue.glasses),
            treatment: ids(catalogue.treatments),
            // Facing a cavity, where every coating lasts.
            coating: fc.record({ id: ids(catalogue.coatings), surface: fc.constant(i === 0 ? 2 : 2 * i + 1) }),
            edgeWork: ids(catalogue.edgeWork),
          },
          { requiredKeys: ['glass', 'treatment'] },
        ),
      ),
    ),
    cavities: fc.array(
      fc.oneof(
        fc.record({ width: hundredths, gas: ids(catalogue.gases), spacer: ids(catalogue.spacers) }),
        fc.record({ width: length, gas: fc.constant('air'), spacer: ids(catalogue.spacers), capillary: fc.constant(true) }),
      ),
      { minLength: count - 1, maxLength: count - 1 },
    ),
  }),
);

const drafts: fc.Arbitrary<Draft> = fc
  .record({
    system: fc.constantFrom<Draft['system']>('imperial', 'metric'),
    width: length,
    height: length,
    quantity: fc.integer({ min: 1, max: 10_000 }).map(String),
    tag: fc.string({ maxLength: 80, unit: 'grapheme' }).filter((tag) => tag.length <= 80 && !/\p{Cc}/u.test(tag)),
    layers,
    altitude: fc.oneof(fc.constant(''), fc.integer({ min: -100, max: 8000 }).map(String), fc.constant('1798.32 m')),
    edges: fc.array(fc.oneof(fc.constant(''), fc.constant('0'), length), { minLength: 3, maxLength: 3 }),
    outside: fc.oneof(fc.constant(''), fc.integer({ min: -60, max: 50 }).map(String), fc.constant('−10 °C'), fc.constant('14 °F')),
    humidity: fc.oneof(fc.constant(''), fc.integer({ min: 0, max: 100 }).map(String)),
    questions: fc.tuple(answers, answers, answers, answers, answers),
  })
  .map(({ system, width, height, quantity, tag, layers: built, altitude, edges, outside, humidity, questions }) => {
    const written = (mm: string | undefined) => (mm ? lengthText(mm, system) : '');
    return {
      system,
      width: written(width),
      height: written(height),
      quantity,
      tag,
      makeUp: null,
      ...built,
      place: {
        ...emptyPlace,
        altitude,
        bottomEdge: written(edges[0]),
        topEdge: written(edges[1]),
        walkingSurface: written(edges[2]),
        outsideTemperature: outside,
        insideHumidity: humidity,
        door: questions[0],
        nearDoor: questions[1],
        wetArea: questions[2],
        stairs: questions[3],
        footOfStairs: questions[4],
      },
    };
  });

describe('the Bench in the address', () => {
  it('comes back as the same unit, for readers of either system', () => {
    fc.assert(
      fc.property(drafts, fc.constantFrom<Draft['system']>('imperial', 'metric'), (draft, reader) => {
        const before = readDraft(draft, catalogue);
        fc.pre(before.unit !== null);
        const { draft: reopened, ignored } = reopen(encodeDraft(draft), reader);
        expect(ignored).toEqual([]);
        const after = readDraft(reopened, catalogue);
        expect(after.unit).toEqual(before.unit);
        expect([after.quantity, after.tag]).toEqual([before.quantity, before.tag]);
        // Written once more it is the same address, so that no entry of the history comes of reading one.
        if (reader === draft.system) expect(encodeDraft(reopened)).toEqual(encodeDraft(draft));
      }),
      { numRuns: 400 },
    );
  });

  it('reads the same after the measures were changed and changed back', () => {
    fc.assert(
      fc.property(drafts, (draft) => {
        const other = draft.system === 'imperial' ? 'metric' : 'imperial';
        const back = rewriteDraft(rewriteDraft(draft, other), draft.system);
        expect(readDraft(rewriteDraft(draft, other), catalogue).unit).toEqual(readDraft(draft, catalogue).unit);
        expect(readDraft(back, catalogue).unit).toEqual(readDraft(draft, catalogue).unit);
      }),
    );
  });

  it('is short and readable, and leaves out what is as usual', () => {
    const draft: Draft = { ...firstDraft('imperial', catalogue), width: '36 1/2', height: '48-1/4"', quantity: '6', tag: 'Bay, left' };
    draft.place = { ...emptyPlace, altitude: '5,900', bottomEdge: '14', door: false };
    expect(encodeDraft(draft)).toEqual({
      size: '36.5x48.25in',
      units: '6',
      tag: 'Bay, left',
      make: 'clear-4:annealed,16:argon:stainless,clear-4:annealed:low-e-soft@3',
      place: 'altitude:5900ft,bottom:14in,door:no',
    });
    expect(encodeDraft(firstDraft('metric', catalogue))).toMatchObject({ size: '900x1200mm', units: null, tag: null, place: null });
  });

  it('reads what people write into an address', () => {
    const read = (size: string) =>
      readDraft(reopen({ size, units: null, tag: null, make: null, place: null }, 'metric').draft, catalogue).unit;
    expect(read('36 1/2 x 48 1/4 in')).toMatchObject({ width: '927.1', height: '1225.55' });
    expect(read('927.1x1225.55')).toMatchObject({ width: '927.1', height: '1225.55' });
  });

  it.each([
    ['size', '0x0mm'],
    ['size', 'NaNx1e9'],
    ['size', '-5x900mm'],
    ['units', '0'],
    ['units', '1.5'],
    ['units', '10000000'],
    ['tag', 'x'.repeat(81)],
    ['make', 'clear-4:annealed'],
    ['make', 'unobtainium-4:annealed,16:argon:stainless,clear-4:annealed'],
    ['make', 'clear-4:annealed:low-e-soft@7,16:argon:stainless,clear-4:annealed'],
    ['make', 'clear-4:annealed,-3:argon:stainless,clear-4:annealed'],
    ['make', ','.repeat(5000)],
    ['place', 'altitude:up'],
    ['place', 'door:perhaps'],
    ['place', '__proto__:yes'],
  ] as const)('says that it ignored %s=%s, and stands as usual', (name, value) => {
    const address: DraftAddress = { size: null, units: null, tag: null, make: null, place: null, [name]: value };
    const { draft, ignored } = reopen(address, 'imperial');
    expect(ignored).toHaveLength(1);
    const { unit, quantity, problems } = readDraft(draft, catalogue);
    expect(problems).toEqual([]);
    expect(unit).not.toBeNull();
    expect(quantity).toBe(1);
  });

  it('never breaks, whatever stands there', () => {
    const text = fc.oneof(fc.string({ unit: 'binary' }), fc.string(), fc.stringMatching(/^[\dx.:,@a-z-]{0,40}$/));
    fc.assert(
      fc.property(fc.tuple(text, text, text, text, text), ([size, units, tag, make, place]) => {
        const { draft } = decodeDraft((name) => ({ size, units, tag, make, place })[name], 'imperial', catalogue);
        readDraft(draft, catalogue);
        encodeDraft(draft);
      }),
      { numRuns: 500 },
    );
  });
});

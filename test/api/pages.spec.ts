import { publicPaths } from '@shared/contracts/catalogue-parts';
import { catalogueParts } from '@shared/contracts/catalogue-parts';
import { evaluateUnit } from '@shared/glazing/evaluate-unit';
import { decodeMakeUp } from '../../src/app/bench/make-up-address';
import { benchMake, comparingUnit } from '../../src/app/catalogue/comparing-unit';
import { itemHead, makerHead, partHead, questionsHead } from '../../src/app/catalogue/heads';
import { itemsOf, viewOf } from '../../src/app/catalogue/parts/part-views';
import { questionsOf } from '../../src/app/catalogue/questions';
import { catalogueFactory } from '../factories/catalogue-factory';

const catalogue = catalogueFactory();
const every = catalogueParts.flatMap(({ slug }) => itemsOf(slug, catalogue).map((item) => [slug, item.id, item] as const));

describe('pages of the catalogue', () => {
  it('compare parts in the unit that the engineering evaluates', () => {
    const { thermal } = evaluateUnit(comparingUnit(catalogue), catalogue);
    const gases = viewOf('gases').comparison!(catalogue);
    const argon = gases.rows.find(({ item }) => item === 'argon')!;
    expect(argon.cells[0]).toBe(thermal.uEn673!.toFixed(2));
    const coatings = viewOf('coatings').comparison!(catalogue);
    expect(coatings.rows.find(({ name }) => name === 'soft low-e on surface 3')!.cells[0]).toBe(thermal.uEn673!.toFixed(2));
    expect(coatings.rows[0]!.name).toBe('no coating');
    expect(Number(coatings.rows[0]!.cells[0])).toBeGreaterThan(2.5);
  });

  it.each(every)('lead from %s/%s to a Bench that holds it', (slug, id, item) => {
    const make = viewOf(slug).bench?.(item, catalogue);
    if (make === undefined || make === null) return expect(['grids', 'shapes']).toContain(slug);
    const read = decodeMakeUp(make, catalogue);
    expect(read).toMatchObject({ ignored: [] });
    return expect(slug === 'shapes' || JSON.stringify(read).includes(`"${id}"`)).toBe(true);
  });

  it('write the address of a make-up as the Bench does', () => {
    const unit = comparingUnit(catalogue, { outer: { edgeWork: 'seamed' } });
    expect(benchMake(unit)).toBe('clear-4:annealed::seamed,16:argon:stainless,clear-4:annealed:low-e-soft@3');
    expect(decodeMakeUp(benchMake(unit), catalogue)).toMatchObject({ lites: unit.lites, cavities: unit.cavities });
  });

  it.each(every)('%s/%s has a head of its own, and figures with their source', (slug, id, item) => {
    const head = itemHead(slug, id, catalogue);
    expect(head.path).toBe(`/catalogue/${slug}/${id}`);
    expect(head.description.length).toBeLessThanOrEqual(160);
    expect(head.hidden).toBeUndefined();
    const facts = viewOf(slug).facts(item, catalogue);
    expect(JSON.stringify(facts)).not.toMatch(/NaN|undefined|Infinity/);
  });

  it('no two pages have the same title or description', () => {
    const heads = [
      ...catalogueParts.map(({ slug }) => partHead(slug, catalogue)),
      ...every.map(([slug, id]) => itemHead(slug, id, catalogue)),
      ...catalogue.fabricators.map(({ id }) => makerHead(id, catalogue)),
    ];
    expect(new Set(heads.map(({ title }) => title)).size).toBe(heads.length);
    expect(new Set(heads.map(({ description }) => description)).size).toBe(heads.length);
    const paths = publicPaths(catalogue);
    for (const { path } of heads) expect(paths).toContain(path);
  });

  it('an item that is not there is hidden from search engines', () => {
    expect(itemHead('gases', 'phlogiston', catalogue).hidden).toBe(true);
    expect(makerHead('nobody', catalogue).hidden).toBe(true);
  });

  it('questions are told to search engines as they are answered on the page', () => {
    const questions = questionsOf(catalogue);
    const [faq] = questionsHead(questions).structured!;
    expect(faq).toMatchObject({ '@type': 'FAQPage' });
    const told = (faq as unknown as { mainEntity: { name: string; acceptedAnswer: { text: string } }[] }).mainEntity;
    expect(told.map(({ name }) => name)).toEqual(questions.map(({ question }) => question));
    expect(told.every(({ acceptedAnswer }) => acceptedAnswer.text.length > 60 && !/NaN|undefined/.test(acceptedAnswer.text))).toBe(true);
    for (const { more } of questions) if (more) expect(publicPaths(catalogue)).toContain(more.path);
  });
});

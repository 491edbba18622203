import { evaluationSchema } from '@shared/contracts/evaluation';
import { badUnits } from '../factories/bad-units';
import { unitFactory } from '../factories/catalogue-factory';
import { type Market, marketFactory } from '../factories/market-factory';
import { rowCounts } from '../factories/row-counts';

describe('evaluating a unit', () => {
  let market: Market;
  beforeAll(async () => {
    market = await marketFactory();
  });
  afterAll(() => market.close());

  it('answers a visitor in the shape of the contract', async () => {
    const { status, body } = await market.visitor.post('/api/units/evaluate', { unit: unitFactory() });
    expect(status).toBe(200);
    expect(() => evaluationSchema.parse(body)).not.toThrow();
    expect(body.geometry.area).toBeCloseTo(0.9271 * 1.22555, 12);
    expect(body.buildability.map(({ fabricator }: { fabricator: { id: string } }) => fabricator.id).sort()).toEqual([
      'aldersund',
      'kestrel-ford',
      'northmere',
    ]);
  });

  it('takes a rectangle where no shape is named', async () => {
    const { shape: _shape, ...unit } = unitFactory();
    const plain = await market.visitor.post('/api/units/evaluate', { unit });
    const named = await market.visitor.post('/api/units/evaluate', { unit: unitFactory() });
    expect(plain.body).toEqual(named.body);
  });

  it.each([
    ['below every minimum', '60'],
    ['above every maximum', '9000'],
  ])('evaluates a size %s, and says of each maker why not', async (_what, width) => {
    const { status, body } = await market.visitor.post('/api/units/evaluate', { unit: unitFactory({ width }) });
    expect(status).toBe(200);
    for (const { canBuild, reasons } of body.buildability) {
      expect(canBuild).toBe(false);
      expect(reasons.length).toBeGreaterThan(0);
    }
  });

  it.each(badUnits)('refuses %s at the field', async (_what, unit, pointer) => {
    const before = rowCounts(market.dependencies.database.db);
    const answer = await market.visitor.post('/api/units/evaluate', { unit });
    expect(answer).toMatchObject({ status: 422, type: 'application/problem+json' });
    expect(answer.body.errors).toContainEqual({ pointer: `/unit${pointer}`, detail: expect.any(String) });
    expect(rowCounts(market.dependencies.database.db)).toEqual(before);
  });
});

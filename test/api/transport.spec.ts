import request from 'supertest';
import { type Endpoint } from '@shared/contracts/endpoint';
import { endpoints } from '@shared/contracts/endpoints';
import { routes } from '@api/api';
import { type Market, marketFactory } from '../factories/market-factory';

describe('the API over HTTP', () => {
  let market: Market;
  beforeAll(async () => {
    market = await marketFactory();
  });
  afterAll(() => market.close());
  const problem = (text: string) =>
    JSON.parse(text) as { type: string; status: number; detail: string; requestId: string; errors?: unknown[] };

  it('serves every endpoint of the contracts, each once', () => {
    const served = routes.map(({ endpoint }) => endpoint.id);
    expect([...served].sort()).toEqual((endpoints as readonly Endpoint[]).map(({ id }) => id).sort());
  });

  it('is healthy', async () => expect((await market.visitor.get('/api/health')).body).toEqual({ status: 'ok' }));

  it('describes every endpoint in OpenAPI, with components for what it refers to', async () => {
    const { body, text } = await market.visitor.get('/api/openapi.json');
    for (const { path, method } of endpoints) {
      expect(body.paths[path.replace(/:(\w+)/g, '{$1}')][method.toLowerCase()]).toBeDefined();
    }
    for (const [, name = ''] of text.matchAll(/#\/components\/schemas\/([\w-]+)/g)) expect(body.components.schemas[name]).toBeDefined();
  });

  it('answers problems with a request id that stands in the header too', async () => {
    const answer = await market.visitor.get('/api/nothing-here');
    expect(answer.status).toBe(404);
    expect(answer.type).toBe('application/problem+json');
    expect(problem(answer.text).requestId).toBe(answer.headers['x-request-id']);
  });

  it.each([
    ['20 000 levels of nesting', '['.repeat(20_000), 'application/json', 400],
    ['closed nesting', '['.repeat(20_000) + ']'.repeat(20_000), 'application/json', 400],
    ['no JSON', '{"unit":', 'application/json', 400],
    ['another media type', '<unit/>', 'application/xml', 415],
    ['a form', 'unit=1', 'application/x-www-form-urlencoded', 415],
    ['an unknown charset', '{}', 'application/json; charset=utf-7', 415],
    ['a name given twice', '{"unit": {"width": "1", "width": "2"}}', 'application/json', 422],
    ['nothing', '', 'application/json', 422],
    ['null', 'null', 'application/json', 422],
    ['a list', '[]', 'application/json', 422],
  ])('refuses %s', async (_what, raw, type, status) => {
    const answer = await market.visitor.send('post', '/api/units/evaluate', raw, { 'content-type': type });
    expect(answer.status).toBe(status);
    expect(answer.type).toBe('application/problem+json');
    expect(answer.text).not.toMatch(/node_modules|at .*\.ts:/);
  });

  it('refuses a body of 10 MB without reading it whole', async () => {
    const answer = await market.visitor.send('post', '/api/units/evaluate', JSON.stringify({ unit: 'x'.repeat(10_000_000) }), {
      'content-type': 'application/json',
    });
    expect(answer.status).toBe(413);
  });

  it.each(['limit=0', 'limit=201', 'limit=ten', 'cursor=nonsense', 'cursor=W10'])('points at a wrong query: %s', async (query) => {
    const buyer = await market.as('buyer@ottery.example');
    const answer = await buyer.get(`/api/trade-accounts?${query}`);
    expect(answer.status).toBe(422);
    expect(problem(answer.text).errors).toEqual([expect.objectContaining({ pointer: `/${query.split('=')[0]}` })]);
  });

  it('walks a list by its cursor, each item once', async () => {
    const operator = await market.as('operator@sealyard.example');
    const seen: string[] = [];
    for (let cursor: string | null = ''; cursor !== null;) {
      const { body } = await operator.get(`/api/market/companies?limit=4${cursor && `&cursor=${cursor}`}`);
      seen.push(...(body.items as { id: string }[]).map(({ id }) => id));
      cursor = body.nextCursor as string | null;
    }
    expect(seen).toHaveLength(22);
    expect(new Set(seen).size).toBe(22);
  });

  it('tells no technology and forbids framing', async () => {
    const { headers } = await request(market.app).get('/api/health');
    expect(headers['x-powered-by']).toBeUndefined();
    expect(headers['content-security-policy']).toContain("frame-ancestors 'none'");
    expect(headers['x-content-type-options']).toBe('nosniff');
  });
});

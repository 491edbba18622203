import request from 'supertest';
import { DEMO_PASSWORD } from '@seeds/demo/load-companies';
import { type Market, marketFactory } from '../factories/market-factory';

const signIn = (market: Market, email: string, password = DEMO_PASSWORD) =>
  request(market.app).post('/api/auth/sign-in').send({ email, password });

describe('sign-in', () => {
  let market: Market;
  beforeEach(async () => {
    market = await marketFactory();
  });
  afterEach(() => market.close());

  it('answers the user and sets an httpOnly, SameSite cookie and a readable XSRF-TOKEN', async () => {
    const answer = await signIn(market, 'Buyer@Ottery.example');
    expect(answer.status).toBe(200);
    expect(answer.body).toMatchObject({
      user: { email: 'buyer@ottery.example', roles: ['buyer'], company: { id: 'ottery', kind: 'dealer', name: 'Ottery Glass & Sash' } },
    });
    const [session = '', xsrf = ''] = answer.headers['set-cookie'] as unknown as string[];
    expect(session).toMatch(/^sealyard-session=.*HttpOnly.*SameSite=Lax/);
    expect(xsrf).toMatch(/^XSRF-TOKEN=/);
    expect(xsrf).not.toContain('HttpOnly');
  });

  it('tells nobody whether an address exists', async () => {
    const known = await signIn(market, 'buyer@ottery.example', 'wrong');
    const unknown = await signIn(market, 'nobody@ottery.example', 'wrong');
    const told = ({ status, body }: { status: number; body: Record<string, unknown> }) => [status, { ...body, requestId: '' }];
    expect(known.status).toBe(401);
    expect(told(known)).toEqual(told(unknown));
  });

  it('does the same work for a known and an unknown address', async () => {
    const time = async (email: string) => {
      const start = performance.now();
      await signIn(market, email, 'wrong');
      return performance.now() - start;
    };
    await time('warm@up.example');
    const known: number[] = [];
    const unknown: number[] = [];
    for (let i = 0; i < 4; i++) {
      known.push(await time('buyer@ottery.example'));
      unknown.push(await time('nobody@ottery.example'));
    }
    const middle = (times: number[]) => times.sort((a, b) => a - b)[2] ?? 0;
    // Hashing takes tens of milliseconds; skipping it would show as a factor of ten and more.
    expect(middle(unknown)).toBeGreaterThan(middle(known) / 4);
  });

  it('ends the session on the server: a kept cookie is worth nothing after sign-out', async () => {
    const buyer = await market.as('buyer@ottery.example');
    expect((await buyer.get('/api/auth/me')).status).toBe(200);
    expect((await buyer.post('/api/auth/sign-out')).status).toBe(204);
    expect((await buyer.get('/api/auth/me')).status).toBe(401);
  });

  it('lists own sessions and ends one of them', async () => {
    const first = await market.as('buyer@ottery.example');
    const second = await market.as('buyer@ottery.example');
    const { items } = (await second.get('/api/auth/sessions')).body as { items: { id: string; current: boolean }[] };
    expect(items).toHaveLength(2);
    const other = items.find((item) => !item.current)!;
    expect((await second.delete(`/api/auth/sessions/${other.id}`)).status).toBe(204);
    expect((await first.get('/api/auth/me')).status).toBe(401);
    expect((await second.get('/api/auth/me')).status).toBe(200);
  });

  it('ends no session of somebody else', async () => {
    const buyer = await market.as('buyer@ottery.example');
    const { items } = (await buyer.get('/api/auth/sessions')).body as { items: { id: string }[] };
    const stranger = await market.as('buyer@perrin.example');
    expect((await stranger.delete(`/api/auth/sessions/${items[0]?.id}`)).status).toBe(404);
    expect((await buyer.get('/api/auth/me')).status).toBe(200);
  });

  it('ends a session after its longest life, however busy', async () => {
    const buyer = await market.as('buyer@ottery.example');
    market.clock.now += 15 * 60 * 60 * 1000;
    expect((await buyer.get('/api/auth/me')).status).toBe(401);
  });

  it('refuses a change without the XSRF header, or with another session’s', async () => {
    const buyer = await market.as('buyer@ottery.example');
    const call = (header: string) => buyer.post('/api/auth/sign-out', {}, { 'x-xsrf-token': header });
    expect((await call('')).status).toBe(403);
    const other = await signIn(market, 'admin@ottery.example');
    const token = (other.headers['set-cookie'] as unknown as string[])[1]?.match(/XSRF-TOKEN=([^;]*)/)?.[1] ?? '';
    expect((await call(token)).status).toBe(403);
    expect((await buyer.get('/api/auth/me')).status).toBe(200);
  });

  it('refuses a token signed with another secret', async () => {
    const forger = await marketFactory({ SESSION_SECRET: 'another secret, long enough to be taken for one' });
    const answer = await signIn(forger, 'buyer@ottery.example');
    const cookie = (answer.headers['set-cookie'] as unknown as string[]).map((c) => c.split(';')[0]).join('; ');
    expect((await request(market.app).get('/api/auth/me').set('Cookie', cookie)).status).toBe(401);
    forger.close();
  });

  it('limits failed attempts at one account, with Retry-After, and no others', async () => {
    for (let i = 0; i < 10; i++) expect((await signIn(market, 'buyer@ottery.example', 'wrong')).status).toBe(401);
    const answer = await signIn(market, 'buyer@ottery.example');
    expect(answer.status).toBe(429);
    expect(Number(answer.headers['retry-after'])).toBeGreaterThan(0);
    expect(answer.type).toBe('application/problem+json');
    expect((await signIn(market, 'admin@ottery.example')).status).toBe(200);
  });

  it.each([
    [{}, 422, '/email'],
    [{ email: 'a@b.example', password: 'x', extra: 1 }, 422, '/extra'],
    [{ email: ['a'], password: 'x' }, 422, '/email'],
    [{ email: 'a@b.example', password: 'x'.repeat(300) }, 422, '/password'],
  ])('answers %j with %s at %s', async (body, status, pointer) => {
    const answer = await market.visitor.post('/api/auth/sign-in', body);
    expect(answer.status).toBe(status);
    expect(JSON.parse(answer.text)).toMatchObject({ errors: expect.arrayContaining([expect.objectContaining({ pointer })]) });
  });
});

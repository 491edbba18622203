import express from 'express';
import { JSDOM } from 'jsdom';
import request from 'supertest';
import { sitemapRoutes } from '@api/catalogue/sitemap-routes';
import { robotsText, sitemapXml } from '@api/catalogue/sitemap';
import { catalogueFactory, wideMaker } from '../factories/catalogue-factory';
import { type Market, marketFactory } from '../factories/market-factory';

const locations = (xml: string) =>
  [...new JSDOM(xml, { contentType: 'text/xml' }).window.document.querySelectorAll('urlset > url > loc')].map((loc) => loc.textContent);

describe('what search engines are told', () => {
  let market: Market;
  beforeAll(async () => {
    market = await marketFactory({ PUBLIC_URL: 'https://units.example' });
  });
  afterAll(() => market.close());
  const get = (path: string) => request(express().use(sitemapRoutes(market.dependencies))).get(path);

  it('lists every item and maker under the public address, each once', async () => {
    const answer = await get('/sitemap.xml');
    expect(answer.status).toBe(200);
    expect(answer.type).toBe('application/xml');
    const found = locations(answer.text);
    const { gases, edgeWork, fabricators } = market.dependencies.catalogue();
    const wanted = [
      '/',
      '/bench',
      '/catalogue',
      '/catalogue/sizes',
      ...gases.map(({ id }) => `/catalogue/gases/${id}`),
      ...edgeWork.map(({ id }) => `/catalogue/edge-work/${id}`),
      ...fabricators.map(({ id }) => `/catalogue/makers/${id}`),
    ].map((path) => `https://units.example${path}`);
    expect(found).toEqual(expect.arrayContaining(wanted));
    expect(new Set(found).size).toBe(found.length);
  });

  it('follows the catalogue as it changes', () => {
    const before = locations(sitemapXml('https://units.example', catalogueFactory()));
    const newcomer = { ...wideMaker(), id: 'new & bold' };
    const after = locations(sitemapXml('https://units.example', catalogueFactory({ fabricators: [newcomer] })));
    expect(before.some((url) => url.includes('bold'))).toBe(false);
    expect(after).toContain('https://units.example/catalogue/makers/new%20%26%20bold');
  });

  it('keeps crawlers out of what needs a sign-in and shows them the site map', async () => {
    const answer = await get('/robots.txt');
    expect(answer.type).toBe('text/plain');
    expect(answer.text).toBe(robotsText('https://units.example'));
    expect(answer.text).toMatch(/^Disallow: \/api\/$/m);
    expect(answer.text).toMatch(/^Sitemap: https:\/\/units\.example\/sitemap\.xml$/m);
    expect(answer.text).not.toMatch(/Disallow: \/(catalogue|bench)?$/m);
  });
});

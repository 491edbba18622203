import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { isThermallyImproved } from '@shared/glazing/whole-window';
import { catalogueData } from '../../seeds/reference/catalogue-data';
import { catalogueSchema } from '@shared/contracts/catalogue';
import { referenceClear4 } from '@shared/glazing/solar-en410';
import { checksPage } from './checks-page';
import { glazingChecks } from './glazing-checks';

describe.each(glazingChecks)('$subject', ({ checks }) => {
  it.each(checks)('$what ($source)', ({ expected, tolerance, ours }) => {
    expect(Math.abs(ours() - expected)).toBeLessThanOrEqual(tolerance + 1e-12);
  });
});

describe('the page of checks', () => {
  it('is up to date (npm run docs:checks)', () => {
    expect(readFileSync(join(__dirname, 'README.md'), 'utf8')).toBe(checksPage(glazingChecks));
  });
});

describe('the reference catalogue', () => {
  it('keeps its contract', () => {
    const whole = { ...catalogueData, fabricators: [] };
    expect(catalogueSchema.parse(whole)).toEqual(whole);
  });

  it('never uses an identity twice', () => {
    for (const items of Object.values(catalogueData)) {
      const ids = items.map(({ id }) => id);
      expect(new Set(ids).size).toBe(ids.length);
    }
  });

  it('calls a spacer thermally improved exactly where Σ(d·λ) ≤ 0.007 W/K (ISO 10077-1)', () => {
    for (const { wallMm, conductivity, thermallyImproved } of catalogueData.spacers) {
      expect(thermallyImproved).toBe(isThermallyImproved(wallMm, conductivity));
    }
  });

  it('has plies that make up the thickness of every glass', () => {
    for (const { plies, interlayerMm, actualMm } of catalogueData.glasses) {
      expect(plies.reduce((a, b) => a + b, interlayerMm)).toBeCloseTo(actualMm, 9);
    }
  });

  it('has the clear 4 mm that coating data stand on', () => {
    expect(catalogueData.glasses.find(({ id }) => id === 'clear-4')?.optics).toEqual(referenceClear4);
  });

  it('marks invented figures as such', () => {
    for (const { source } of [...catalogueData.glasses, ...catalogueData.coatings]) expect(source).toMatch(/[Ii]nvented/);
  });
});

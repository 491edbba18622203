import { type Capabilities } from '@shared/contracts/catalogue';
import { type PlantCalendar } from '@api/database/schema/companies';
import { type Terms } from '@shared/contracts/trade-accounts';
import { shapeClasses } from '@shared/contracts/units';

/** The three invented makers of the demo market, and what each can build. Invented limits. */

export interface DemoFabricator {
  id: string;
  name: string;
  domain: string;
  town: string;
  country: string;
  measureSystem: 'imperial' | 'metric';
  timeZone: string;
  locale: string;
  currency: 'USD' | 'EUR';
  prefix: string;
  about: string;
  plantAltitudeM: number;
  letterhead: { lines: string[]; email: string; phone: string; registration: string };
  terms: Terms;
  capabilities: Capabilities;
  calendar: PlantCalendar;
  people: Record<'sales' | 'accounts' | 'plant' | 'admin', string>;
}

const spacerWidths = ['6', '8', '9', '10', '12', '13', '14', '16', '18', '20'];

/** Largest sheets by nominal thickness, long × short edge in mm. */
const sheets: [glass: string, long: string, short: string][] = [
  ['clear-3', '2200', '1500'],
  ['clear-4', '3000', '2000'],
  ['clear-5', '3600', '2400'],
  ['clear-6', '4200', '2600'],
  ['clear-8', '4800', '3000'],
  ['clear-10', '4800', '3000'],
  ['clear-12', '4800', '3000'],
  ['bronze-6', '3600', '2400'],
  ['grey-6', '3600', '2400'],
  ['obscured-4', '2100', '1300'],
  ['laminated-clear-6', '3200', '2200'],
  ['laminated-clear-8', '3200', '2200'],
];

const upTo = (long: number, short: number) =>
  sheets.map(([glass, maxLong, maxShort]) => ({
    glass,
    maxLong: String(Math.min(Number(maxLong), long)),
    maxShort: String(Math.min(Number(maxShort), short)),
  }));

export const northmere: DemoFabricator = {
  id: 'northmere',
  name: 'Northmere Sealed Units',
  domain: 'northmere.example',
  town: 'Northmere',
  country: 'US',
  measureSystem: 'imperial',
  timeZone: 'America/New_York',
  locale: 'en-US',
  currency: 'USD',
  prefix: 'NM',
  about:
    'Double and triple units for houses and shopfronts; tempers its own glass from 3 mm; a list of standard sizes that leave the line fastest.',
  plantAltitudeM: 240,
  letterhead: {
    lines: ['114 Cullet Road', 'Northmere, OH 44000'],
    email: 'accounts@northmere.example',
    phone: '+1 555 0114',
    registration: 'Bank: Lakeside Trade Bank, account 0044 7710 2290',
  },
  terms: { netDays: 30, endOfMonth: false, discountPercent: '2', discountDays: 10 },
  capabilities: {
    lites: { max: 3 },
    unit: {
      minWidth: '254',
      minHeight: '254',
      maxLong: '3048',
      maxShort: '2134',
      maxAreaM2: 5.2,
      maxAspect: 8,
      maxWeightKg: 180,
      maxOverall: '54',
    },
    glass: upTo(3048, 2134),
    treatments: [
      { treatment: 'annealed', minNominalMm: 2.5, maxNominalMm: 12, minEdge: '150', maxLong: '3048', maxShort: '2134' },
      { treatment: 'heat-strengthened', minNominalMm: 4, maxNominalMm: 10, minEdge: '254', maxLong: '2743', maxShort: '1829' },
      { treatment: 'tempered', minNominalMm: 3, maxNominalMm: 12, minEdge: '254', maxLong: '2743', maxShort: '1829' },
    ],
    coatings: [
      { coating: 'low-e-soft', maxPerUnit: 2 },
      { coating: 'low-e-solar', maxPerUnit: 1 },
      { coating: 'low-e-hard', maxPerUnit: 1 },
    ],
    spacers: [
      { spacer: 'aluminium', widths: spacerWidths },
      { spacer: 'stainless', widths: spacerWidths },
      { spacer: 'warm-edge', widths: ['10', '12', '14', '16', '18', '20'] },
    ],
    gases: [
      { gas: 'air', minCavity: '6', maxCavity: '20' },
      { gas: 'argon', minCavity: '8', maxCavity: '20' },
      { gas: 'krypton', minCavity: '6', maxCavity: '12' },
    ],
    grids: [
      { bar: 'flat-16', minCavity: '9' },
      { bar: 'profiled-19', minCavity: '14' },
    ],
    edgeWork: ['seamed', 'ground'],
    shapes: [...shapeClasses],
    capillary: { offered: true, adviseAboveM: 900 },
  },
  calendar: {
    workingDays: [1, 2, 3, 4, 5],
    closed: ['2025-07-04', '2025-11-27', '2025-12-25', '2026-01-01', '2026-07-03', '2026-11-26', '2026-12-25', '2027-01-01'],
    leadTimes: [
      { class: 'usual', name: 'Usual', workingDays: 8 },
      { class: 'rush', name: 'Rush', workingDays: 3 },
    ],
  },
  people: { sales: 'Odile Marsh', accounts: 'Bram Tolliver', plant: 'Ines Varga', admin: 'Hector Lund' },
};

export const kestrelFord: DemoFabricator = {
  id: 'kestrel-ford',
  name: 'Kestrel Ford Glassworks',
  domain: 'kestrelford.example',
  town: 'Kestrel Ford',
  country: 'US',
  measureSystem: 'imperial',
  timeZone: 'America/Chicago',
  locale: 'en-US',
  currency: 'USD',
  prefix: 'KF',
  about: 'Large units and shopfront glass, heavy lites, any size at the price of its area; no standard sizes.',
  plantAltitudeM: 310,
  letterhead: {
    lines: ['9 Ferry Street', 'Kestrel Ford, IL 61000'],
    email: 'accounts@kestrelford.example',
    phone: '+1 555 0139',
    registration: 'Bank: Prairie Union, account 7102 0033 18',
  },
  terms: { netDays: 30, endOfMonth: true, discountPercent: null, discountDays: null },
  capabilities: {
    lites: { max: 3 },
    unit: {
      minWidth: '300',
      minHeight: '300',
      maxLong: '4267',
      maxShort: '2591',
      maxAreaM2: 9,
      maxAspect: 10,
      maxWeightKg: 420,
      maxOverall: '64',
    },
    glass: upTo(4267, 2591),
    treatments: [
      { treatment: 'annealed', minNominalMm: 3, maxNominalMm: 12, minEdge: '200', maxLong: '4267', maxShort: '2591' },
      { treatment: 'heat-strengthened', minNominalMm: 5, maxNominalMm: 12, minEdge: '300', maxLong: '4267', maxShort: '2438' },
      { treatment: 'tempered', minNominalMm: 3, maxNominalMm: 12, minEdge: '300', maxLong: '4267', maxShort: '2438' },
    ],
    coatings: [
      { coating: 'low-e-soft', maxPerUnit: 2 },
      { coating: 'low-e-solar', maxPerUnit: 2 },
    ],
    spacers: [
      { spacer: 'aluminium', widths: spacerWidths },
      { spacer: 'stainless', widths: ['8', '10', '12', '14', '16', '18', '20'] },
      { spacer: 'warm-edge', widths: ['12', '14', '16', '18', '20'] },
    ],
    gases: [
      { gas: 'air', minCavity: '6', maxCavity: '20' },
      { gas: 'argon', minCavity: '8', maxCavity: '20' },
    ],
    grids: [{ bar: 'flat-16', minCavity: '9' }],
    edgeWork: ['seamed', 'ground', 'polished'],
    shapes: ['rectangle', 'raked-head', 'triangle', 'polygon'],
    capillary: { offered: true, adviseAboveM: 800 },
  },
  calendar: {
    workingDays: [1, 2, 3, 4, 5],
    closed: [
      '2025-07-04',
      '2025-11-27',
      '2025-11-28',
      '2025-12-25',
      '2026-01-01',
      '2026-07-03',
      '2026-11-26',
      '2026-11-27',
      '2026-12-25',
      '2027-01-01',
    ],
    leadTimes: [
      { class: 'usual', name: 'Usual', workingDays: 11 },
      { class: 'rush', name: 'Rush', workingDays: 5 },
    ],
  },
  people: { sales: 'Petra Quill', accounts: 'Jonah Abbey', plant: 'Lucio Brandt', admin: 'Maud Ferris' },
};

export const aldersund: DemoFabricator = {
  id: 'aldersund',
  name: 'Aldersund Glas',
  domain: 'aldersund.example',
  town: 'Aldersund',
  country: 'DK',
  measureSystem: 'metric',
  timeZone: 'Europe/Copenhagen',
  locale: 'en-GB',
  currency: 'EUR',
  prefix: 'AG',
  about: 'Triple units for cold places, warm-edge spacers, krypton for slim cavities; works in millimetres and tempers from 4 mm up.',
  plantAltitudeM: 12,
  letterhead: {
    lines: ['Havnegade 21', '9990 Aldersund'],
    email: 'accounts@aldersund.example',
    phone: '+45 5550 0121',
    registration: 'IBAN DK50 0040 0440 1162 43',
  },
  terms: { netDays: 30, endOfMonth: false, discountPercent: null, discountDays: null },
  capabilities: {
    lites: { max: 3 },
    unit: {
      minWidth: '200',
      minHeight: '200',
      maxLong: '3500',
      maxShort: '2250',
      maxAreaM2: 6.5,
      maxAspect: 10,
      maxWeightKg: 260,
      maxOverall: '60',
    },
    glass: upTo(3500, 2250).filter(({ glass }) => glass !== 'clear-3'),
    treatments: [
      { treatment: 'annealed', minNominalMm: 4, maxNominalMm: 12, minEdge: '180', maxLong: '3500', maxShort: '2250' },
      { treatment: 'heat-strengthened', minNominalMm: 4, maxNominalMm: 12, minEdge: '250', maxLong: '3500', maxShort: '2100' },
      { treatment: 'tempered', minNominalMm: 4, maxNominalMm: 12, minEdge: '250', maxLong: '3500', maxShort: '2100' },
    ],
    coatings: [
      { coating: 'low-e-soft', maxPerUnit: 2 },
      { coating: 'low-e-solar', maxPerUnit: 1 },
    ],
    spacers: [
      { spacer: 'stainless', widths: ['8', '10', '12', '14', '16', '18', '20'] },
      { spacer: 'warm-edge', widths: ['8', '10', '12', '14', '16', '18', '20'] },
    ],
    gases: [
      { gas: 'air', minCavity: '6', maxCavity: '20' },
      { gas: 'argon', minCavity: '8', maxCavity: '20' },
      { gas: 'krypton', minCavity: '6', maxCavity: '14' },
    ],
    grids: [{ bar: 'profiled-19', minCavity: '14' }],
    edgeWork: ['seamed', 'polished'],
    shapes: ['rectangle', 'raked-head', 'gable', 'segment-arch', 'half-round', 'circle', 'triangle'],
    capillary: { offered: false, adviseAboveM: 600 },
  },
  calendar: {
    workingDays: [1, 2, 3, 4, 5],
    closed: ['2025-12-25', '2025-12-26', '2026-01-01', '2026-04-03', '2026-04-06', '2026-05-14', '2026-12-25', '2027-01-01'],
    leadTimes: [
      { class: 'usual', name: 'Usual', workingDays: 14 },
      { class: 'rush', name: 'Rush', workingDays: 7 },
    ],
  },
  people: { sales: 'Freja Holm', accounts: 'Anders Vinther', plant: 'Signe Krog', admin: 'Karl Dahl' },
};

export const demoFabricators = [northmere, kestrelFord, aldersund];

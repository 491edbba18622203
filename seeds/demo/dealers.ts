/** The invented dealers of the demo market. Ship-to places, limits and tiers are invented. */

export interface DemoAccount {
  maker: 'northmere' | 'kestrel-ford' | 'aldersund';
  tier: 'A' | 'B' | 'C';
  /** in whole currency units */
  limit: number;
  countsFrom?: 'placement' | 'dispatch';
}

export interface DemoPlace {
  label: string;
  line: string;
  town: string;
  region: string;
  postcode: string;
  jurisdiction: string;
  zone: 'local' | 'regional' | 'remote';
  altitudeM: number;
}

export interface DemoDealer {
  id: string;
  name: string;
  domain: string;
  town: string;
  buyer: string;
  admin: string;
  accounts: DemoAccount[];
  places: DemoPlace[];
  /** exemption certificate for a jurisdiction */
  exempt?: { jurisdiction: string; certificate: string };
  /** whole currency units; an order above waits for the admin */
  buyerLimit?: number;
  /** orders a month, roughly, and how late it pays on the average, in days */
  ordersAMonth: number;
  paysLate: number;
}

const ohio = (label: string, line: string, town: string, postcode: string, zone: DemoPlace['zone'] = 'local'): DemoPlace => ({
  label,
  line,
  town,
  region: 'OH',
  postcode,
  jurisdiction: 'US-OH',
  zone,
  altitudeM: 260,
});
const illinois = (label: string, line: string, town: string, postcode: string, zone: DemoPlace['zone'] = 'regional'): DemoPlace => ({
  ...ohio(label, line, town, postcode, zone),
  region: 'IL',
  jurisdiction: 'US-IL',
  altitudeM: 200,
});
const colorado = (label: string, line: string, town: string, postcode: string): DemoPlace => ({
  ...ohio(label, line, town, postcode, 'remote'),
  region: 'CO',
  jurisdiction: 'US-CO',
  altitudeM: 1800,
});

export const namedDealers: DemoDealer[] = [
  {
    id: 'ottery',
    name: 'Ottery Glass & Sash',
    domain: 'ottery.example',
    town: 'Ottery',
    buyer: 'Nell Ashdown',
    admin: 'Tobias Reeve',
    accounts: [
      { maker: 'northmere', tier: 'B', limit: 60_000 },
      { maker: 'kestrel-ford', tier: 'B', limit: 40_000 },
      { maker: 'aldersund', tier: 'B', limit: 25_000 },
    ],
    places: [
      ohio('Workshop', '27 Sash Lane', 'Ottery', '44101'),
      ohio('Yard, east gate', '3 Canal Street', 'Ottery', '44102'),
      illinois('Prairie depot', '410 Grain Road', 'Millbank', '61204'),
      colorado('Mountain site office', '88 Timberline Way', 'High Fork', '80401'),
    ],
    ordersAMonth: 11,
    paysLate: 2,
  },
  {
    id: 'perrin',
    name: 'Plumb & Perrin Glaziers',
    domain: 'perrin.example',
    town: 'Perrin',
    buyer: 'Idris Plumb',
    admin: 'Colette Perrin',
    accounts: [
      { maker: 'northmere', tier: 'A', limit: 35_000 },
      { maker: 'kestrel-ford', tier: 'C', limit: 50_000, countsFrom: 'dispatch' },
    ],
    places: [ohio('Shop', '5 Putty Row', 'Perrin', '44320'), illinois('Lakeside yard', '71 Shore Drive', 'Lakeside', '60901')],
    exempt: { jurisdiction: 'US-OH', certificate: 'OH-RS-204417' },
    buyerLimit: 6_000,
    ordersAMonth: 8,
    paysLate: -4,
  },
  {
    id: 'millrace',
    name: 'Millrace Home Windows',
    domain: 'millrace.example',
    town: 'Millrace',
    buyer: 'Wanda Pike',
    admin: 'Gregor Shaw',
    accounts: [{ maker: 'northmere', tier: 'A', limit: 12_000 }],
    places: [ohio('Showroom', '900 Weir Street', 'Millrace', '44810', 'regional')],
    ordersAMonth: 5,
    paysLate: 18,
  },
];

const more: [
  name: string,
  town: string,
  buyer: string,
  admin: string,
  ordersAMonth: number,
  paysLate: number,
  ...accounts: DemoAccount[],
][] = [
  ['Lantern Street Windows', 'Lantern', 'Mabel Orr', 'Silas Venn', 7, 0, { maker: 'northmere', tier: 'B', limit: 45_000 }],
  [
    'Bellweather Glass',
    'Bellweather',
    'Rufus Hale',
    'Ida Crane',
    6,
    5,
    { maker: 'northmere', tier: 'B', limit: 40_000 },
    { maker: 'kestrel-ford', tier: 'A', limit: 20_000 },
  ],
  ['Harrow & Tine Joinery', 'Harrow', 'Owen Tine', 'Berta Harrow', 4, -2, { maker: 'northmere', tier: 'A', limit: 20_000 }],
  [
    'Saltbox Restoration',
    'Saltbox',
    'Flora Nye',
    'Amos Kell',
    5,
    9,
    { maker: 'northmere', tier: 'C', limit: 70_000 },
    { maker: 'aldersund', tier: 'A', limit: 20_000 },
  ],
  ['Cobble Hill Glazing', 'Cobble Hill', 'Jules Ponder', 'Rhea Stott', 7, 30, { maker: 'northmere', tier: 'B', limit: 60_000 }],
  ['Fennel Road Conservatories', 'Fennel', 'Ada Birch', 'Noel Parish', 5, 3, { maker: 'kestrel-ford', tier: 'B', limit: 60_000 }],
  [
    'Three Elms Windows',
    'Three Elms',
    'Vito Lark',
    'Greta Moss',
    6,
    1,
    { maker: 'northmere', tier: 'B', limit: 40_000 },
    { maker: 'kestrel-ford', tier: 'B', limit: 30_000 },
  ],
  [
    'Quarry Lane Shopfronts',
    'Quarry',
    'Hugo Steen',
    'Lena Frost',
    4,
    12,
    { maker: 'kestrel-ford', tier: 'C', limit: 120_000, countsFrom: 'dispatch' },
  ],
  ['Oriel & Sons', 'Oriel', 'Percy Oriel', 'Dora Oriel', 5, 0, { maker: 'northmere', tier: 'A', limit: 30_000 }],
  [
    'Tidewater Glass Supply',
    'Tidewater',
    'Marta Holt',
    'Evan Rusk',
    8,
    6,
    { maker: 'northmere', tier: 'C', limit: 90_000 },
    { maker: 'kestrel-ford', tier: 'C', limit: 60_000 },
  ],
  ['Pinder Window Repair', 'Pinder', 'Kit Pinder', 'Joan Pinder', 6, 15, { maker: 'northmere', tier: 'A', limit: 15_000 }],
  [
    'Marrow & Vale Builders',
    'Marrow Vale',
    'Asa Marrow',
    'Tess Vale',
    3,
    22,
    { maker: 'aldersund', tier: 'B', limit: 50_000 },
    { maker: 'northmere', tier: 'A', limit: 25_000 },
  ],
  ['Greenfinch Homes', 'Greenfinch', 'Lyle Barton', 'Opal Reed', 4, 4, { maker: 'aldersund', tier: 'C', limit: 80_000 }],
  ['Copperhill Glass', 'Copperhill', 'Nora Fitch', 'Earl Dobbs', 5, 8, { maker: 'kestrel-ford', tier: 'A', limit: 25_000 }],
  ['Willow Dam Glaziers', 'Willow Dam', 'Simon Crewe', 'Hattie Bloom', 4, -1, { maker: 'northmere', tier: 'B', limit: 30_000 }],
];

export const otherDealers: DemoDealer[] = more.map(([name, town, buyer, admin, ordersAMonth, paysLate, ...accounts], i) => {
  const id = town.toLowerCase().replace(/ /g, '-');
  return {
    id,
    name,
    domain: `${id}.example`,
    town,
    buyer,
    admin,
    accounts,
    places: [
      i % 3 === 2
        ? illinois('Yard', `${20 + i} Mill Road`, town, `61${300 + i}`)
        : ohio('Yard', `${20 + i} Mill Road`, town, `44${500 + i}`, i % 2 ? 'regional' : 'local'),
    ],
    ordersAMonth,
    paysLate,
  };
});

export const demoDealers = [...namedDealers, ...otherDealers];

import type { GlassItem, Optics } from '@shared/contracts/catalogue';

/** The glasses of the catalogue. Thicknesses are minimum thicknesses of ASTM C1036 (from memory); optical data are invented. */

const source = 'Thickness: ASTM C1036 (from memory). Light and sun: invented, plausible; for comparing only';

/** Glass that looks the same from both faces. */
function even(visibleTransmittance: number, solarTransmittance: number, visibleReflectance = 0.08, solarReflectance = 0.075): Optics {
  return {
    visibleTransmittance,
    visibleReflectanceOutside: visibleReflectance,
    visibleReflectanceInside: visibleReflectance,
    solarTransmittance,
    solarReflectanceOutside: solarReflectance,
    solarReflectanceInside: solarReflectance,
  };
}

function single(
  id: string,
  name: string,
  nominalMm: number,
  actualMm: number,
  tint: string | null,
  optics: Optics,
  summary: string,
  whenToChoose: string,
): GlassItem {
  return {
    id,
    name,
    summary,
    whenToChoose,
    construction: 'monolithic',
    nominalMm,
    actualMm,
    plies: [actualMm],
    interlayerMm: 0,
    tint,
    optics,
    source,
  };
}

const clear: [nominalMm: number, actualMm: number, visible: number, solar: number, whenToChoose: string][] = [
  [2.5, 2.16, 0.91, 0.87, 'Small lites and repairs in old sashes.'],
  [3, 2.92, 0.91, 0.86, 'Small and middling windows.'],
  [4, 3.78, 0.9, 0.84, 'Middling windows; the usual lite in metric markets.'],
  [5, 4.57, 0.9, 0.82, 'Larger windows, or more strength and quiet.'],
  [6, 5.56, 0.89, 0.8, 'Large windows, doors and shopfronts.'],
  [8, 7.42, 0.88, 0.76, 'Very large lites, or quiet behind a thinner lite.'],
  [10, 9.02, 0.87, 0.72, 'Heavy duty and great heights; heavy to handle.'],
  [12, 11.91, 0.86, 0.69, 'The heaviest duty; few makers seal it.'],
];

export const clearGlasses: GlassItem[] = clear.map(([nominal, actual, visible, solar, when]) =>
  single(`clear-${nominal}`, `clear ${nominal} mm`, nominal, actual, null, even(visible, solar), 'Plain float glass.', when),
);

export const otherGlasses: GlassItem[] = [
  single(
    'bronze-6',
    'bronze 6 mm',
    6,
    5.56,
    'bronze',
    even(0.53, 0.49, 0.06, 0.055),
    'Float glass tinted bronze in the mass.',
    'Less sun and glare with a warm tone. Put it outside.',
  ),
  single(
    'grey-6',
    'grey 6 mm',
    6,
    5.56,
    'grey',
    even(0.44, 0.46, 0.055, 0.055),
    'Float glass tinted grey in the mass.',
    'Less sun and glare in a neutral tone. Put it outside.',
  ),
  single(
    'obscured-4',
    'obscured 4 mm',
    4,
    3.78,
    'obscured',
    even(0.86, 0.81, 0.08, 0.075),
    'Rolled with a fine pattern that blurs the view.',
    'Bathrooms and side lights: light without sight.',
  ),
  laminated(
    'laminated-clear-6',
    'laminated clear 6 mm',
    6,
    2.92,
    0.38,
    even(0.89, 0.76),
    'Two lites of 3 mm with a tough film between; holds together when broken.',
    'Safety overhead and at low level, and against forced entry and noise.',
  ),
  laminated(
    'laminated-clear-8',
    'laminated clear 8 mm',
    8,
    3.78,
    0.76,
    even(0.87, 0.71),
    'Two lites of 4 mm with a double film between.',
    'More safety, strength and quiet than the thinner one.',
  ),
];

function laminated(
  id: string,
  name: string,
  nominalMm: number,
  ply: number,
  interlayerMm: number,
  optics: Optics,
  summary: string,
  whenToChoose: string,
): GlassItem {
  const actualMm = Number((2 * ply + interlayerMm).toFixed(2));
  return {
    id,
    name,
    summary,
    whenToChoose,
    construction: 'laminated',
    nominalMm,
    actualMm,
    plies: [ply, ply],
    interlayerMm,
    tint: null,
    optics,
    source,
  };
}

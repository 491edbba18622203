import type { Evaluation } from '../contracts/evaluation';
import type { GasItem } from '../contracts/catalogue';
import { mixWithAir } from './gas-properties';
import type { ResolvedLite, ResolvedUnit } from './resolve-unit';

/** EN 673:2011. Constants from memory, held against ISO 10077-1:2006 table C.2 in test/outside. */
export const uncoatedEmissivity = 0.837;
const stefanBoltzmann = 5.67e-8;
const meanTemperature = 283;
const totalDifference = 15;
const gravity = 9.81;
const outsideCoefficient = 25;
const insideResistance = 0.13;
const glassResistivity = 1.0;
const interlayerResistivity = 1 / 0.2;

/** What one cavity is to heat: width in mm, emissivity of the two faces. */
export interface ThermalCavity {
  widthMm: number;
  gas: GasItem['gas'];
  fill: number;
  emissivities: readonly [number, number];
}

export interface ThermalResult {
  /** W/(m²·K) */
  u: number;
  /** hs in W/(m²·K), Nusselt number, temperature difference in K, from outside in */
  cavities: { hs: number; nusselt: number; deltaT: number }[];
}

/**
 * U-value at the centre of glass.
 *
 * @param liteResistances m²K/W of each lite
 * @param slope degrees from horizontal, 90 vertical; below, heat flows upward
 * @param insideEmissivity of the face to the room
 */
export function uValueEn673(
  liteResistances: readonly number[],
  cavities: readonly ThermalCavity[],
  slope = 90,
  insideEmissivity = uncoatedEmissivity,
): ThermalResult {
  let shares = cavities.map(() => totalDifference / cavities.length);
  let found = cavities.map((cavity, i) => cavityConductance(cavity, shares[i]!, slope));
  // The share of each cavity and its convection depend on each other; a few rounds settle them.
  for (let round = 0; round < 100 && cavities.length > 1; round++) {
    const total = found.reduce((sum, { hs }) => sum + 1 / hs, 0);
    const next = found.map(({ hs }) => totalDifference / hs / total);
    const settled = next.every((share, i) => Math.abs(share - shares[i]!) < 1e-9);
    shares = next;
    found = cavities.map((cavity, i) => cavityConductance(cavity, shares[i]!, slope));
    if (settled) break;
  }
  const resistance =
    1 / outsideCoefficient +
    insideSurfaceResistance(insideEmissivity) +
    liteResistances.reduce((a, b) => a + b, 0) +
    found.reduce((sum, { hs }) => sum + 1 / hs, 0);
  return { u: 1 / resistance, cavities: found.map(({ hs, nusselt }, i) => ({ hs, nusselt, deltaT: shares[i]! })) };
}

/** The U-value part of an evaluation. */
export function thermalOf(unit: ResolvedUnit, { u, cavities }: ThermalResult): Evaluation['thermal'] {
  const slope = unit.place.slope ?? 90;
  return {
    applies: true,
    statement:
      slope === 90
        ? null
        : `For glass at ${slope}° from horizontal, heat flowing upward. Declared values are for vertical glass, so do not compare them with this.`,
    method: {
      name: 'EN 673:2011',
      boundary: `outside 25 W/(m²·K), inside 0.13 m²K/W, mean 283 K, 15 K over the cavities, ${slope === 90 ? 'vertical' : `${slope}° from horizontal`}; nominal thickness of single glass, plies of laminated glass as they are`,
      leavesOut: 'spacer and frame, grid bars, sun, wind and loss of gas over the years; centre of glass alone',
    },
    uEn673: u,
    cavities,
  };
}

/** EN 673 of a unit as it is placed. */
export function thermalResultOf(unit: ResolvedUnit): ThermalResult {
  return uValueEn673(
    unit.lites.map(liteResistance),
    thermalCavitiesOf(unit),
    unit.place.slope ?? 90,
    faceEmissivity(unit, 2 * unit.lites.length),
  );
}

/** Conductance from lite to lite, centre to centre of the glass, W/(m²·K), from outside in: EN 410's Λ. */
export function conductancesBetweenLites(unit: ResolvedUnit, { cavities }: ThermalResult): number[] {
  const halves = unit.lites.map((lite) => liteResistance(lite) / 2);
  return cavities.map(({ hs }, i) => 1 / (1 / hs + halves[i]! + halves[i + 1]!));
}

export function thermalCavitiesOf(unit: ResolvedUnit): ThermalCavity[] {
  return unit.cavities.map(({ widthMm, gas }, i) => ({
    widthMm,
    gas: gas.gas,
    fill: gas.fill,
    emissivities: [faceEmissivity(unit, 2 * i + 2), faceEmissivity(unit, 2 * i + 3)] as const,
  }));
}

/** Resistance of a lite, m²K/W: nominal thickness of a single ply (declared values), plies and interlayer of a laminate. */
export function liteResistance({ glass }: Pick<ResolvedLite, 'glass'>): number {
  const glassMm = glass.construction === 'laminated' ? glass.plies.reduce((a, b) => a + b, 0) : glass.nominalMm;
  return (glassMm * glassResistivity + glass.interlayerMm * interlayerResistivity) / 1000;
}

function faceEmissivity({ lites }: ResolvedUnit, surface: number): number {
  const coating = lites[Math.ceil(surface / 2) - 1]?.coating;
  return coating?.surface === surface ? coating.item.emissivity : uncoatedEmissivity;
}

/** A coated face to the room radiates less: hi = 3.6 + 4.1·ε/0.837 (EN 673:2011, from memory). */
function insideSurfaceResistance(emissivity: number): number {
  return emissivity === uncoatedEmissivity ? insideResistance : 1 / (3.6 + (4.1 * emissivity) / uncoatedEmissivity);
}

function cavityConductance(
  { widthMm, gas, fill, emissivities: [e1, e2] }: ThermalCavity,
  deltaT: number,
  slope: number,
): { hs: number; nusselt: number } {
  const s = widthMm / 1000;
  const { density, viscosity, conductivity, specificHeat } = mixWithAir(gas, fill);
  const grashof = (gravity * s ** 3 * deltaT * density ** 2) / (meanTemperature * viscosity ** 2);
  const prandtl = (viscosity * specificHeat) / conductivity;
  const nusselt = nusseltAt(grashof * prandtl, slope);
  const radiation = (4 * stefanBoltzmann * meanTemperature ** 3) / (1 / e1 + 1 / e2 - 1);
  return { hs: (nusselt * conductivity) / s + radiation, nusselt };
}

/** A·(Gr·Pr)ⁿ, never below 1; between the three given slopes linear from the nearer two (EN 673:2011, from memory). */
function nusseltAt(grashofPrandtl: number, slope: number): number {
  const vertical = () => Math.max(1, 0.035 * grashofPrandtl ** 0.38);
  const half = () => Math.max(1, 0.1 * grashofPrandtl ** 0.31);
  const level = () => Math.max(1, 0.16 * grashofPrandtl ** 0.28);
  if (slope >= 90) return vertical();
  if (slope >= 45) return half() + ((slope - 45) / 45) * (vertical() - half());
  return level() + (slope / 45) * (half() - level());
}

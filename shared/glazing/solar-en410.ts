import type { Optics } from '../contracts/catalogue';
import type { Evaluation } from '../contracts/evaluation';
import type { ResolvedLite, ResolvedUnit } from './resolve-unit';
import { conductancesBetweenLites, type ThermalResult, uncoatedEmissivity } from './thermal-en673';

/** EN 410:2011 boundary for the secondary heat flow, W/(m²·K) (from memory). */
const outsideCoefficient = 23;
const insideCoefficient = (emissivity: number) => 3.6 + (4.4 * emissivity) / uncoatedEmissivity;

/** The glass that the catalogue's coating data stand on: clear, 4 mm. Invented, plausible. */
export const referenceClear4: Optics = {
  visibleTransmittance: 0.9,
  visibleReflectanceOutside: 0.08,
  visibleReflectanceInside: 0.08,
  solarTransmittance: 0.84,
  solarReflectanceOutside: 0.075,
  solarReflectanceInside: 0.075,
};

/** Transmittance and the reflectance of both faces, 0 to 1, in one band. */
export interface Pane {
  transmittance: number;
  outside: number;
  inside: number;
}

/** A stack of panes: what passes, what comes back, and what each pane keeps, 0 to 1. */
export interface Stack {
  transmittance: number;
  reflectance: number;
  absorptances: number[];
}

/**
 * Panes one behind another, with all reflections between them (EN 410:2011, multiple glazing).
 * Solved as up- and downward fluxes in each gap, which for two and three panes gives the
 * standard's formulas.
 */
export function stackPanes(panes: readonly Pane[]): Stack {
  // Reflectance of everything behind gap i, seen from outside.
  const behind = new Array<number>(panes.length + 1).fill(0);
  for (let i = panes.length - 1; i >= 0; i--) {
    const { transmittance, outside, inside } = panes[i]!;
    behind[i] = outside + (transmittance ** 2 * behind[i + 1]!) / (1 - inside * behind[i + 1]!);
  }
  let inward = 1;
  const absorptances = panes.map(({ transmittance, outside, inside }, i) => {
    const next = (inward * transmittance) / (1 - inside * behind[i + 1]!);
    const back = next * behind[i + 1]!;
    const kept = inward * (1 - transmittance - outside) + back * (1 - transmittance - inside);
    inward = next;
    return kept;
  });
  return { transmittance: inward, reflectance: behind[0]!, absorptances };
}

/**
 * Share of the absorbed sun that ends in the room: each pane's heat splits by the resistance to
 * both sides.
 *
 * @param conductances W/(m²·K) from pane to pane, from outside in
 */
export function secondaryHeat(
  absorptances: readonly number[],
  conductances: readonly number[],
  insideEmissivity = uncoatedEmissivity,
): number {
  const resistances = conductances.map((lambda) => 1 / lambda);
  const outside = 1 / outsideCoefficient;
  const total = outside + 1 / insideCoefficient(insideEmissivity) + resistances.reduce((a, b) => a + b, 0);
  let toPane = outside;
  return absorptances.reduce((sum, absorbed, i) => {
    const share = (absorbed * toPane) / total;
    toPane += resistances[i] ?? 0;
    return sum + share;
  }, 0);
}

/** Optics of a lite as it is built in: its coating's data carried over to its own glass, the coated face where it is. */
export function liteOptics({ glass, coating }: Pick<ResolvedLite, 'glass' | 'coating'>): Optics {
  if (!coating) return glass.optics;
  const { optics: coated } = coating.item;
  const visible = carryOver(
    coated.visibleTransmittance,
    coated.visibleReflectanceOutside,
    coated.visibleReflectanceInside,
    glass.optics.visibleTransmittance,
    referenceClear4.visibleTransmittance,
  );
  const solar = carryOver(
    coated.solarTransmittance,
    coated.solarReflectanceOutside,
    coated.solarReflectanceInside,
    glass.optics.solarTransmittance,
    referenceClear4.solarTransmittance,
  );
  const facesOut = coating.surface % 2 === 1;
  return {
    visibleTransmittance: visible.transmittance,
    visibleReflectanceOutside: facesOut ? visible.coatedFace : visible.glassFace,
    visibleReflectanceInside: facesOut ? visible.glassFace : visible.coatedFace,
    solarTransmittance: solar.transmittance,
    solarReflectanceOutside: facesOut ? solar.coatedFace : solar.glassFace,
    solarReflectanceInside: facesOut ? solar.glassFace : solar.coatedFace,
  };
}

/** Light and sun of an evaluation. */
export function solarOf(unit: ResolvedUnit, thermal: ThermalResult): Evaluation['solar'] {
  const optics = unit.lites.map(liteOptics);
  const light = stackPanes(
    optics.map((o) => ({
      transmittance: o.visibleTransmittance,
      outside: o.visibleReflectanceOutside,
      inside: o.visibleReflectanceInside,
    })),
  );
  const sun = stackPanes(
    optics.map((o) => ({ transmittance: o.solarTransmittance, outside: o.solarReflectanceOutside, inside: o.solarReflectanceInside })),
  );
  const inner = unit.lites.at(-1)?.coating;
  const emissivity = inner?.surface === 2 * unit.lites.length ? inner.item.emissivity : uncoatedEmissivity;
  const inwards = secondaryHeat(sun.absorptances, conductancesBetweenLites(unit, thermal), emissivity);
  return {
    applies: true,
    statement: 'Broadband figures, for comparing. Spectral data of the very products decide.',
    method: {
      name: 'EN 410:2011, broadband',
      boundary: 'sun at right angles, outside 23 W/(m²·K), inside 8 W/(m²·K) on uncoated glass, conductances by EN 673',
      leavesOut:
        'spectral data, other angles of the sun, grid bars, frame and shading; coating data are carried over from 4 mm clear glass',
    },
    g: sun.transmittance + inwards,
    directTransmittance: sun.transmittance,
    lightTransmittance: light.transmittance,
    lightReflectance: light.reflectance,
    absorptance: sun.absorptances,
  };
}

/**
 * An approximation of our own: a coating on other glass lets through in proportion to that glass;
 * what it reflects through the glass passes the glass twice.
 */
function carryOver(transmittance: number, coatedFace: number, glassFace: number, own: number, reference: number) {
  const ratio = own / reference;
  const surface = 0.04;
  return {
    transmittance: Math.min(1 - coatedFace, transmittance * ratio),
    coatedFace,
    glassFace: surface + (glassFace - surface) * ratio ** 2,
  };
}

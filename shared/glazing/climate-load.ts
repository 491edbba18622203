/** Loads that weather and height make inside a sealed cavity. */

/** Pressure of the standard atmosphere at h m, Pa (ISO 2533:1975). */
export function standardPressure(altitude: number): number {
  return 101_325 * (1 - 2.25577e-5 * altitude) ** 5.25588;
}

/** A change against the day of sealing: K, kPa, and m of height. */
export interface ClimateChange {
  temperature: number;
  airPressure: number;
  altitude: number;
}

/** The summer and the winter that EN 16612:2019 and DIN 18008-2 take (from memory). */
export const summer: ClimateChange = { temperature: 20, airPressure: -2, altitude: 600 };
export const winter: ClimateChange = { temperature: -25, airPressure: 4, altitude: -300 };

/** Isochoric pressure, kPa: what the cavity would push with if the glass did not give way (EN 16612:2019, DIN 18008-2). */
export function isochoricPressure({ temperature, airPressure, altitude }: ClimateChange): number {
  return 0.34 * temperature - airPressure + 0.012 * altitude;
}

/**
 * Insulating-unit factor of two lites: the part of the isochoric pressure that stays, 0 to 1
 * (EN 16612:2019). Lengths in mm; `bv` as `displacedVolume` gives it.
 */
export function insulatingUnitFactor(shortEdge: number, cavity: number, d1: number, d2: number, bv: number): number {
  const characteristic = 28.9 * ((cavity * d1 ** 3 * d2 ** 3) / ((d1 ** 3 + d2 ** 3) * bv)) ** 0.25;
  return 1 / (1 + (shortEdge / characteristic) ** 4);
}

/**
 * Pressure of each cavity against the air outside, in the units of the loads: as `insulatingUnitFactor`
 * does for two lites, here for any number. Each lite bends with the difference of its two sides
 * and takes room from one cavity for the other; the gas answers in proportion.
 *
 * @param stiffness of each lite, 1/mm: `28.9⁴·d³/(Bv·a⁴)` with d and a in mm
 * @param widths of each cavity, mm
 * @param isochoric pressure of each cavity
 * @param outside load on lite 1, inward
 */
export function cavityPressures(
  stiffness: readonly number[],
  widths: readonly number[],
  isochoric: readonly number[],
  outside: number,
): number[] {
  const n = widths.length;
  // p·s + (p − left)/k₁ + (p − right)/k₂ = p₀·s for each cavity, a chain of neighbours; the room's side is 0.
  const lower = new Array<number>(n).fill(0);
  const diagonal = new Array<number>(n).fill(0);
  const upper = new Array<number>(n).fill(0);
  const right = new Array<number>(n).fill(0);
  for (let i = 0; i < n; i++) {
    const before = 1 / stiffness[i]!;
    const after = 1 / stiffness[i + 1]!;
    diagonal[i] = widths[i]! + before + after;
    right[i] = isochoric[i]! * widths[i]!;
    if (i > 0) lower[i] = -before;
    else right[i] = right[i]! + outside * before;
    if (i < n - 1) upper[i] = -after;
  }
  for (let i = 1; i < n; i++) {
    const factor = lower[i]! / diagonal[i - 1]!;
    diagonal[i] = diagonal[i]! - factor * upper[i - 1]!;
    right[i] = right[i]! - factor * right[i - 1]!;
  }
  const pressures = new Array<number>(n).fill(0);
  for (let i = n - 1; i >= 0; i--) {
    pressures[i] = (right[i]! - upper[i]! * (pressures[i + 1] ?? 0)) / diagonal[i]!;
  }
  return pressures;
}

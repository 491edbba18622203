import type { GasItem } from '../contracts/catalogue';

/** Of a gas at 10 °C. */
export interface GasProperties {
  /** kg/m³ */
  density: number;
  /** Pa·s */
  viscosity: number;
  /** W/(m·K) */
  conductivity: number;
  /** J/(kg·K) */
  specificHeat: number;
}

/** EN 673:2011, table of gas properties at 10 °C (from memory). */
export const gasAt10: Record<GasItem['gas'], GasProperties> = {
  air: { density: 1.232, viscosity: 1.761e-5, conductivity: 0.02496, specificHeat: 1008 },
  argon: { density: 1.699, viscosity: 2.164e-5, conductivity: 0.01684, specificHeat: 519 },
  krypton: { density: 3.56, viscosity: 2.4e-5, conductivity: 0.009, specificHeat: 245 },
  xenon: { density: 5.689, viscosity: 2.226e-5, conductivity: 0.00529, specificHeat: 161 },
};

/** A fill with air as the rest: each property in proportion to the fractions (EN 673:2011). */
export function mixWithAir(gas: GasItem['gas'], fill: number): GasProperties {
  const { air, [gas]: named } = gasAt10;
  const mix = (of: keyof GasProperties) => fill * named[of] + (1 - fill) * air[of];
  return { density: mix('density'), viscosity: mix('viscosity'), conductivity: mix('conductivity'), specificHeat: mix('specificHeat') };
}

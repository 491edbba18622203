import type { ResolvedUnit } from './resolve-unit';
import { thermalResultOf } from './thermal-en673';

/**
 * U-value (EN 673:2011, W/(m²·K)) of a unit as the width of one cavity changes, for the chart.
 *
 * @param cavity which one, from 0
 * @param widthsMm cavity widths to try, mm
 */
export function uCurve(unit: ResolvedUnit, cavity: number, widthsMm: readonly number[] = usualWidths): { widthMm: number; u: number }[] {
  return widthsMm.map((widthMm) => {
    const cavities = unit.cavities.map((own, i) => (i === cavity ? { ...own, widthMm } : own));
    return { widthMm, u: thermalResultOf({ ...unit, cavities }).u };
  });
}

/** 6 to 24 mm by half millimetres. */
const usualWidths = Array.from({ length: 37 }, (_, i) => 6 + i / 2);

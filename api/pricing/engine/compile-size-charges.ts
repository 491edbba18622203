import { type PriceListContent, type UnitFamily } from '@shared/contracts/price-lists';
import { type Unit } from '@shared/contracts/units';
import { type Exact, exact } from '@shared/money/exact';
import { type Measures } from './measures';

/** A percentage of the area charges, a fixed charge, or both: each is one row. */
export interface SurchargeRule {
  family: UnitFamily;
  /** 0.06 for 6 %; null for none */
  part: Exact | null;
  partText: string;
  percentLabel: string;
  fixedMinor: number;
  fixed: string;
  fixedLabel: string;
  id: string;
}

export interface BandRule extends SurchargeRule {
  /** mm, mm² or kg by the kind */
  above: Exact;
}

export type BandKind = PriceListContent['sizeCharges']['bands'][number]['kind'];
export const bandKinds = ['united', 'long edge', 'area', 'weight'] as const satisfies readonly BandKind[];

export interface SizeRules {
  shapes: ReadonlyMap<Unit['shape']['class'], SurchargeRule>;
  nonStandard: SurchargeRule | null;
  /** width × height in mm, as `sizeKey` writes it */
  standardSizes: ReadonlySet<string>;
  /** of each kind that has bands, the highest first */
  bands: readonly { kind: BandKind; bands: readonly BandRule[] }[];
}

/** One text for one size: sides in mm, written without needless zeros. */
export function sizeKey(width: string, height: string): string {
  return `${width}x${height}`;
}

/** Compiles what shape and size add, thresholds and standard sizes in exact mm, mm² and kg. */
export function compileSizeCharges(content: PriceListContent, measures: Measures, minorPer: Exact, version: string): SizeRules {
  const { mm, sizeUnit } = measures;
  const surcharge = (
    family: UnitFamily,
    label: string,
    { percent, fixed }: { percent: string; fixed: string },
    entry: string,
  ): SurchargeRule => {
    const part = exact(percent).dividedBy(100);
    return {
      family,
      part: part.isZero() ? null : part,
      partText: part.toString(),
      percentLabel: `${label}, ${percent} %`,
      fixedMinor: exact(fixed).times(minorPer).round().toNumber(),
      fixed,
      fixedLabel: label,
      id: `${version}/${entry}`,
    };
  };
  const { nonStandard, bands } = content.sizeCharges;

  const perKind: Record<BandKind, { scale: Exact; label: (above: string) => string }> = {
    united: { scale: mm, label: (above) => (sizeUnit === 'in' ? `over ${above} united inches` : `width + height over ${above} mm`) },
    'long edge': { scale: mm, label: (above) => `long edge over ${above} ${sizeUnit}` },
    area: { scale: mm.times(mm).times(measures.areaParts), label: (above) => `over ${above} ${measures.areaUnit}` },
    weight: { scale: measures.kg, label: (above) => `over ${above} ${measures.weightUnit}` },
  };

  return {
    shapes: new Map(
      content.shapes.map((entry) => [entry.shape, surcharge('shape', entry.shape.replace('-', ' '), entry, `shapes/${entry.shape}`)]),
    ),
    nonStandard: nonStandard && surcharge('size', 'non-standard size', nonStandard, 'sizeCharges/nonStandard'),
    standardSizes: new Set(
      content.standardSizes.map(({ width, height }) => sizeKey(exact(width).times(mm).toString(), exact(height).times(mm).toString())),
    ),
    bands: bandKinds
      .map((kind) => ({
        kind,
        bands: bands
          .filter((band) => band.kind === kind)
          .map((band) => ({
            ...surcharge('size', perKind[kind].label(band.above), band, `sizeCharges/bands/${kind.replace(' ', '-')}/${band.above}`),
            above: exact(band.above).times(perKind[kind].scale),
          }))
          .sort((a, b) => b.above.comparedTo(a.above)),
      }))
      .filter((entry) => entry.bands.length > 0),
  };
}

import type { SpacerItem } from '../contracts/catalogue';
import { type FrameKind, linearTransmittance, spacerConductance } from './whole-window';

/**
 * Spacers from the warmest edge to the coldest in a frame, by ψ in W/(m·K) (ISO 10077-1:2006,
 * annex E) and, where that is the same, by what their walls conduct. However good the spacer, the
 * edge of the glass is colder than its centre and fogs first.
 */
export function rankSpacers(spacers: readonly SpacerItem[], frame: FrameKind, lowE: boolean): { spacer: SpacerItem; psi: number }[] {
  const conducts = ({ wallMm, conductivity }: SpacerItem) => spacerConductance(wallMm, conductivity);
  return spacers
    .map((spacer) => ({ spacer, psi: linearTransmittance(frame, spacer.thermallyImproved, lowE) }))
    .sort((a, b) => a.psi - b.psi || conducts(a.spacer) - conducts(b.spacer));
}

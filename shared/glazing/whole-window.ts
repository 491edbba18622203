/** The whole window: ISO 10077-1:2006. Values of annex E from memory. */

export type FrameKind = 'wood or plastic' | 'metal with thermal break' | 'metal without thermal break';

const psi: Record<FrameKind, { ordinary: [number, number]; improved: [number, number] }> = {
  'wood or plastic': { ordinary: [0.06, 0.08], improved: [0.05, 0.06] },
  'metal with thermal break': { ordinary: [0.08, 0.11], improved: [0.06, 0.08] },
  'metal without thermal break': { ordinary: [0.02, 0.05], improved: [0.01, 0.04] },
};

/** Linear transmittance of the edge, W/(m·K), by frame, spacer and whether the glass is low-e coated (annex E). */
export function linearTransmittance(frame: FrameKind, thermallyImproved: boolean, lowE: boolean): number {
  const [uncoated, coated] = psi[frame][thermallyImproved ? 'improved' : 'ordinary'];
  return lowE ? coated : uncoated;
}

/** Σ(d·λ) of a hollow spacer's two long walls, W/K: wall in mm, λ in W/(m·K). */
export function spacerConductance(wallMm: number, conductivity: number): number {
  return (2 * wallMm * conductivity) / 1000;
}

/** Whether a spacer counts as thermally improved: Σ(d·λ) ≤ 0.007 W/K. */
export function isThermallyImproved(wallMm: number, conductivity: number): boolean {
  return spacerConductance(wallMm, conductivity) <= 0.007;
}

export interface WholeWindow {
  /** m² */
  glassArea: number;
  /** W/(m²·K) */
  glassU: number;
  /** m² */
  frameArea: number;
  /** W/(m²·K) */
  frameU: number;
  /** visible perimeter of the glass, m */
  edgeLength: number;
  /** W/(m·K) */
  psi: number;
}

/** Uw in W/(m²·K): (Ag·Ug + Af·Uf + lg·ψ) / (Ag + Af). @throws RangeError without any area */
export function wholeWindowU({ glassArea, glassU, frameArea, frameU, edgeLength, psi: edge }: WholeWindow): number {
  const area = glassArea + frameArea;
  if (!(area > 0)) throw new RangeError('a window has an area');
  return (glassArea * glassU + frameArea * frameU + edgeLength * edge) / area;
}

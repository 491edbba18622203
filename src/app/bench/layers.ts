import { type Lite } from '@shared/contracts/units';
import { type Cavity } from './draft';

export interface Layers {
  lites: Lite[];
  cavities: Cavity[];
}

/** One lite more on the room side, like the innermost but plain; its cavity is like the last. A coating keeps its surface. */
export function addLite({ lites, cavities }: Layers): Layers {
  const last = lites.at(-1);
  const cavity = cavities.at(-1);
  if (!last || !cavity) return { lites, cavities };
  const { glass, treatment, edgeWork } = last;
  return { lites: [...lites, { glass, treatment, ...(edgeWork ? { edgeWork } : {}) }], cavities: [...cavities, { ...cavity }] };
}

/** Without the lite and the cavity outside of it; of the outermost, the cavity inside. Coatings move with their lites. */
export function removeLite({ lites, cavities }: Layers, index: number): Layers {
  const gone = Math.max(0, index - 1);
  return {
    lites: lites
      .filter((_, i) => i !== index)
      .map((lite, i) => (lite.coating && i >= index ? { ...lite, coating: { ...lite.coating, surface: lite.coating.surface - 2 } } : lite)),
    cavities: cavities.filter((_, i) => i !== gone),
  };
}

/** The unit turned round: what faced the weather faces the room. */
export function swapSides({ lites, cavities }: Layers): Layers {
  const surfaces = 2 * lites.length;
  return {
    lites: lites
      .map((lite) => (lite.coating ? { ...lite, coating: { ...lite.coating, surface: surfaces + 1 - lite.coating.surface } } : lite))
      .reverse(),
    cavities: [...cavities].reverse(),
  };
}

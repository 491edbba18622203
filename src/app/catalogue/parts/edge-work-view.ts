import { type Catalogue } from '@shared/contracts/catalogue';
import { benchMake, comparingUnit } from '../comparing-unit';
import { type PartView } from './part-view';

type EdgeWorkItem = Catalogue['edgeWork'][number];

export const edgeWorkView: PartView<EdgeWorkItem> = {
  slug: 'edge-work',
  kind: 'edge work on glass',
  lead: 'What is done to the cut edge of a lite before it is treated and sealed.',
  guide: [
    'A cut edge is sharp and full of tiny cracks, and glass nearly always breaks from its edge. Taking off the arris is safer for hands and better for the glass.',
    'Inside a frame nobody sees the edge. Finer work is for edges that stay in sight, or that take load or heat.',
  ],
  practice: 'a lite is at least seamed before it is tempered.',
  facts: () => [],
  source: () => null,
  offer: (work) => (maker) => (maker.capabilities.edgeWork.includes(work.id) ? 'done' : null),
  bench: ({ id }, catalogue) => benchMake(comparingUnit(catalogue, { outer: { edgeWork: id }, inner: { edgeWork: id } })),
};

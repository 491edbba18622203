import { type MakingStepName } from '@shared/drawings/making-pictures';

/** A step on the way from sheets of glass to a unit. */
export interface MakingStep {
  title: string;
  text: readonly string[];
  /** a statement without a published source */
  practice?: string;
  picture: MakingStepName;
}

export const makingSteps: readonly MakingStep[] = [
  {
    picture: 'cut',
    title: 'The lites are cut',
    text: [
      'Each lite is cut from a large sheet, and its sharp arrises are taken off. What is to be tempered or heat-strengthened is cut to its final size first: afterwards it breaks when it is cut.',
    ],
  },
  {
    picture: 'edge deleted',
    title: 'The coating leaves the edge',
    text: [
      'Where the seal will sit, a soft coat is ground away in a narrow band. Butyl must hold on bare glass; on silver it would hold for a while, and the silver would tarnish from the edge inward.',
    ],
    practice: 'how wide the band is depends on spacer and seals; the maker sets it.',
  },
  {
    picture: 'washed',
    title: 'Both lites are washed',
    text: [
      'Clean water without salts, brushes that do not scratch the coating, and dry air. A fingerprint on an inner face stays for the life of the unit.',
    ],
  },
  {
    picture: 'spacer filled',
    title: 'The spacer is bent and filled',
    text: [
      'A hollow bar is bent or cut to the size of the unit, less the sightline, and filled with beads of molecular sieve, the desiccant. Small holes on its inner face let the beads dry the air in the cavity.',
      'The pores of the sieve are so fine that water vapour enters and the gas does not.',
    ],
    practice: 'sieve with pores of 3 ångström takes up water and leaves argon alone.',
  },
  {
    picture: 'primary seal',
    title: 'The primary seal',
    text: [
      'A cord of butyl runs along both flanks of the spacer. It is soft and sticky, and nothing that glazing uses lets less vapour and gas through. It has no strength to speak of.',
    ],
  },
  {
    picture: 'pressed',
    title: 'The lites are pressed together, and the gas goes in',
    text: [
      'Spacer and second lite are set down and pressed, so that the butyl is flat and unbroken all round. Where a gas was ordered, it takes the place of the air.',
    ],
    practice: 'about nine tenths of the air are replaced.',
  },
  {
    picture: 'secondary seal',
    title: 'The secondary seal',
    text: [
      'The groove that is left round the edge is filled with silicone, polysulfide or a hot melt. This seal holds the lites together against wind, handling and the breathing of the cavity. It lets more vapour through than butyl does; the two need each other.',
    ],
  },
  {
    picture: 'marked',
    title: 'It cures, is marked and leaves',
    text: [
      'When the seal has set, the unit gets its mark on spacer or label: who made it, when, and what it is. Years later the mark tells what to order again.',
    ],
  },
];

import { type Catalogue } from '@shared/contracts/catalogue';
import { comparingUnit, heatAndLight } from './comparing-unit';
import { decimals } from './facts';

/** A question and its answer, a paragraph each. */
export interface Question {
  id: string;
  question: string;
  answer: readonly string[];
  /** where more is said */
  more?: { text: string; path: string };
}

/** The questions with figures of this catalogue. */
export function questionsOf(catalogue: Catalogue): Question[] {
  const u = (change: Parameters<typeof comparingUnit>[1]) => decimals(heatAndLight(comparingUnit(catalogue, change), catalogue).u, 2);
  const air = catalogue.gases.find(({ gas }) => gas === 'air')?.id;
  const filled = air
    ? ` Between two lites of 4 mm, 16 mm apart, argon brings the U-value from ${u({ cavity: { gas: air } })} to ${u({})} W/m²K beside a soft low-e coating, and only from ${u({ cavity: { gas: air }, coating: null })} to ${u({ coating: null })} without one (EN 673:2011, centre of glass).`
    : '';
  return [
    {
      id: 'what-is-a-sealed-unit',
      question: 'What is a sealed unit?',
      answer: [
        'Two or more lites of glass held apart by a spacer and sealed all round, with dry air or a gas between them. It is also called an insulating glass unit, or IGU. It goes into the frame as one piece and cannot be opened.',
      ],
      more: { text: 'How a unit is made', path: '/catalogue/how-a-unit-is-made' },
    },
    {
      id: 'why-does-it-fog',
      question: 'Why is there fog between the lites, and can it be repaired?',
      answer: [
        'Because the seals have let in more water vapour than the desiccant could take up. From then on the first cold morning shows it, on faces that no cloth can reach.',
        'The unit has to be replaced. Drilling and drying may clear the view for a while; it brings back neither the gas nor the seals (common practice, no published source).',
      ],
      more: { text: 'How moisture gets in', path: '/catalogue/how-a-unit-is-made' },
    },
    {
      id: 'fog-on-the-outside',
      question: 'In the morning there is dew on the outside. Is the unit faulty?',
      answer: [
        'No. It insulates so well that the outer lite gets no warmth from the room; on a clear night it cools below the dew point of the air outside. The dew goes with the first sun.',
      ],
    },
    {
      id: 'which-surface',
      question: 'Which surface should the low-e coating be on?',
      answer: [
        'Surfaces are numbered from outside. In a double unit, surface 3 lets in more of the winter sun and surface 2 keeps out more of the summer sun; the U-value is the same either way. A soft coat must face a cavity.',
      ],
      more: { text: 'Coatings side by side', path: '/catalogue/coatings' },
    },
    {
      id: 'is-argon-worth-it',
      question: 'Is argon worth it?',
      answer: [
        `Beside a low-e coating, yes; without one, hardly.${filled}`,
        'A fill leaks slowly. How much is left after years depends on the seals, and nobody can see it from the room.',
      ],
      more: { text: 'Gases side by side', path: '/catalogue/gases' },
    },
    {
      id: 'compare-u-values',
      question: 'May I compare these U-values with those on a North American label?',
      answer: [
        'No. Sealyard shows EN 673, for the centre of the glass at a mean of 10 °C. A North American label is for the whole window, by other methods and in a colder winter, and often in Btu per hour, square foot and degree Fahrenheit. Converting the unit does not convert the method.',
      ],
    },
    {
      id: 'safety-glazing',
      question: 'Do I need safety glass?',
      answer: [
        'The local code and a licensed professional decide. The Bench asks where the unit goes and flags the places that section R308.4 of the International Residential Code names: doors and beside them, low and large panes, wet areas, stairs. A question that is not answered gives “cannot tell”, never “fine”.',
      ],
      more: { text: 'Treatments', path: '/catalogue/treatments' },
    },
    {
      id: 'tube-and-gas',
      question: 'Can a unit have both a capillary tube and argon?',
      answer: [
        'Not an open tube. Through it the unit breathes on its way over high ground, and the gas would leave the same way. Such units are filled with air.',
      ],
      more: { text: 'What capillary tubes are for', path: '/catalogue/how-a-unit-is-made' },
    },
    {
      id: 'cut-tempered',
      question: 'The tempered unit came too large. Can it be trimmed?',
      answer: [
        'No. Tempered and heat-strengthened glass breaks when it is cut, and a sealed unit cannot be cut at all. Measure in several places, take the smallest, and round down.',
      ],
      more: { text: 'Sizes and measuring', path: '/catalogue/sizes' },
    },
    {
      id: 'old-unit',
      question: 'How do I find out what my old unit is made of?',
      answer: [
        'Measure its overall thickness with a calliper at the edge, and look along the spacer for a mark. The table of make-ups by overall thickness shows what it can be. A flame held to the glass shows one reflection for each surface; a coated one has another colour (common practice, no published source).',
      ],
      more: { text: 'Make-ups by overall thickness', path: '/catalogue/sizes' },
    },
    {
      id: 'how-long',
      question: 'How long does a unit last?',
      answer: [
        'Nobody can tell for a single unit. The seals age with heat, sun, movement and above all with water that stands in the rebate. A frame that drains and setting blocks in the right places do more for a unit than anything one can order.',
      ],
    },
    {
      id: 'who-can-buy',
      question: 'Who can buy here?',
      answer: [
        'Dealers who hold a trade account with one of the makers. Everybody may read the catalogue and use the Bench with all its results; prices appear after sign-in, on the terms of each account. No dealer sees another’s prices.',
      ],
      more: { text: 'Makers', path: '/catalogue/makers' },
    },
    {
      id: 'where-figures-come-from',
      question: 'Where do the figures come from?',
      answer: [
        'Calculated ones name their method, edition and boundary, and what they leave out. Each item of the catalogue says where its own data come from; where light, sun or sizes are invented for showing the product, it says so. They are for comparing. The data sheet of the very product decides.',
      ],
    },
  ];
}

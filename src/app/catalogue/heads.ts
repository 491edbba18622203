import { type Catalogue } from '@shared/contracts/catalogue';
import { type PartSlug } from '@shared/contracts/catalogue-parts';
import { type Head } from '../ui/page-meta';
import { itemsOf, partOf, viewOf } from './parts/part-views';
import { type Question } from './questions';

/** What each page of the catalogue says of itself to those who have not opened it yet. */

const overview = { name: 'Catalogue', path: '/catalogue' };

export const frontHead: Head = {
  title: 'Sealyard: sealed units, made to size',
  description:
    'Glass and window dealers specify made-to-size sealed units, see what comes of them, price them on their own terms and order from the makers they hold accounts with.',
  path: '/',
  structured: [
    {
      '@type': 'Organization',
      '@id': '/#sealyard',
      name: 'Sealyard',
      url: '/',
      logo: '/mark.svg',
      description: 'A market for made-to-size sealed units.',
    },
    { '@type': 'WebSite', '@id': '/#site', name: 'Sealyard', url: '/', publisher: { '@id': '/#sealyard' }, inLanguage: 'en' },
  ],
};

export const overviewHead: Head = {
  title: 'Catalogue of sealed units',
  description:
    'What a sealed unit is made of, part by part: glass, treatments, coatings, spacers, gases, grids, shapes and edge work, with figures and drawings.',
  path: '/catalogue',
  trail: [],
};

export const makingHead: Head = {
  title: 'How a sealed unit is made',
  description:
    'Lites, a spacer filled with desiccant, two seals and a gas: how a sealed unit is put together, how moisture gets in and fogs it, and what a capillary tube is for.',
  path: '/catalogue/how-a-unit-is-made',
  trail: [overview],
};

export const sizesHead: Head = {
  title: 'Sizes and measuring',
  description:
    'How to measure for a sealed unit: width before height seen from outside, clearances, setting blocks, diagonals, united inches, and fractions rounded down.',
  path: '/catalogue/sizes',
  trail: [overview],
};

export const makersHead: Head = {
  title: 'Makers of sealed units',
  description: 'The fabricators on Sealyard: the sizes, glass, spacers, gases and shapes that each of them can make.',
  path: '/catalogue/makers',
  trail: [overview],
};

export const outOfReachHead: Head = {
  title: 'The catalogue cannot be read',
  description: 'The catalogue cannot be read just now.',
  path: '/catalogue/out-of-reach',
  hidden: true,
};

export const missingHead: Head = {
  title: 'Nothing by that name',
  description: 'The catalogue holds nothing by that name.',
  path: '/catalogue',
  hidden: true,
};

export function partHead(slug: PartSlug, catalogue: Catalogue): Head {
  const { name } = partOf(slug);
  const path = `/catalogue/${slug}`;
  const items = itemsOf(slug, catalogue);
  return {
    title: slug === 'glass' ? 'Glass for sealed units' : `${name} of sealed units`,
    description: cut(`${viewOf(slug).lead} ${items.map((item) => item.name).join(', ')}.`),
    path,
    trail: [overview],
    structured: [
      {
        '@type': 'DefinedTermSet',
        '@id': path,
        name: `${name} of sealed units`,
        url: path,
        hasDefinedTerm: items.map((item) => ({
          '@type': 'DefinedTerm',
          name: item.name,
          description: item.summary,
          url: `${path}/${item.id}`,
        })),
      },
    ],
  };
}

export function itemHead(slug: PartSlug, id: string, catalogue: Catalogue): Head {
  const item = itemsOf(slug, catalogue).find((each) => each.id === id);
  if (!item) return missingHead;
  const set = `/catalogue/${slug}`;
  const path = `${set}/${item.id}`;
  const description = `${item.summary} ${item.whenToChoose}`;
  return {
    title: `${capital(item.name)}: ${viewOf(slug).kind}`,
    description: cut(description),
    path,
    trail: [overview, { name: partOf(slug).name, path: set }],
    structured: [
      { '@type': 'DefinedTerm', '@id': path, name: item.name, termCode: item.id, description, url: path, inDefinedTermSet: set },
    ],
  };
}

export function makerHead(id: string, { fabricators }: Catalogue): Head {
  const maker = fabricators.find((each) => each.id === id);
  if (!maker) return missingHead;
  const path = `/catalogue/makers/${maker.id}`;
  return {
    title: `${maker.name}: what they can make`,
    description: cut(`${maker.name}, ${maker.town}. ${maker.about}`),
    path,
    trail: [overview, { name: 'Makers', path: '/catalogue/makers' }],
    structured: [{ '@type': 'Organization', '@id': path, name: maker.name, url: path, description: maker.about, location: maker.town }],
  };
}

export function questionsHead(questions: readonly Question[]): Head {
  return {
    title: 'Questions about sealed units',
    description:
      'Why units fog, which surface the coating goes on, whether argon is worth it, what a U-value can be compared with, and who decides on safety glazing.',
    path: '/catalogue/questions',
    trail: [overview],
    structured: [
      {
        '@type': 'FAQPage',
        mainEntity: questions.map(({ question, answer }) => ({
          '@type': 'Question',
          name: question,
          acceptedAnswer: { '@type': 'Answer', text: answer.join(' ') },
        })),
      },
    ],
  };
}

/** At most about 160 letters, which is what search engines show, to the end of a word. */
function cut(text: string): string {
  if (text.length <= 160) return text;
  return `${text.slice(0, 158).replace(/[\s,;.:]+\S*$/, '')}…`;
}

const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1);

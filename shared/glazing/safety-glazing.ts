import type { Evaluation } from '../contracts/evaluation';
import type { ResolvedUnit } from './resolve-unit';

/** Where the International Residential Code asks for safety glazing: IRC 2015, 2018 and 2021, R308.4. */

type Flag = Evaluation['safety'][number];
/** Yes, no, or not known. */
type Answer = boolean | undefined;

const inch = 0.0254;
const nineSquareFeet = 9 * (12 * inch) ** 2;
/** Limits are decimal and numbers binary: what is equal on paper counts as equal. */
const nothing = 1e-9;
const caution =
  'The code has exceptions that this does not check, and railings and guards (R308.4.4) are not asked about. The local code decides; ask a licensed professional.';

interface Condition {
  answer: Answer;
  /** what the answer says when it is yes, such as `bottom edge 14 in above the floor, under 18 in` */
  met: string;
  /** what would have to be known */
  asks: string;
  /** what the answer says when it is no */
  unmet: string;
}

interface Rule {
  rule: string;
  /** all of these together trigger the rule */
  conditions: Condition[];
  /** 16 CFR 1201 Category II is asked for */
  categoryTwo: boolean;
}

/** One flag for each rule; what is not known gives 'cannot tell', never 'not triggered' unless another answer rules it out. */
export function safetyGlazingOf(unit: ResolvedUnit, area: number): Flag[] {
  const satisfied = safelyGlazed(unit);
  return rulesFor(unit, area).map(({ rule, conditions, categoryTwo }) => {
    const no = conditions.find(({ answer }) => answer === false);
    const unknown = conditions.filter(({ answer }) => answer === undefined);
    const verdict = no ? 'not triggered' : unknown.length > 0 ? 'cannot tell' : 'safety glazing asked for';
    const yes = conditions.filter(({ answer }) => answer === true).map(({ met }) => met);
    const trigger = no
      ? no.unmet
      : unknown.length > 0
        ? `Not known: ${unknown.map(({ asks }) => asks).join('; ')}.${yes.length > 0 ? ` Known: ${yes.join('; ')}.` : ''}`
        : `${yes.join('; ')}.`;
    const category = categoryTwo ? ', Category II of 16 CFR 1201,' : ' to 16 CFR 1201';
    return {
      rule,
      verdict,
      trigger: capital(trigger),
      satisfiedBy: `Tempered or laminated safety glass${category} in every lite that can be reached, marked as such.`,
      satisfied: verdict === 'not triggered' ? null : satisfied,
      caution,
    };
  });
}

/** Outer lites can be reached; whether an inner one counts, the local code says. */
function safelyGlazed({ lites }: ResolvedUnit): boolean | null {
  const safe = lites.map(({ glass, treatment }) => treatment.safetyGlazing || glass.construction === 'laminated');
  if (!safe[0] || !safe.at(-1)) return false;
  return safe.every(Boolean) ? true : null;
}

function rulesFor({ place, heightMm }: ResolvedUnit, area: number): Rule[] {
  const height = heightMm / 1000;
  // One edge and the height give the other; on a slope the true top is lower, so this errs to the safe side.
  const bottom = place.bottomEdge ?? (place.topEdge === undefined ? undefined : place.topEdge - height);
  const top = place.topEdge ?? (place.bottomEdge === undefined ? undefined : place.bottomEdge + height);
  const bottomUnder = (inches: number) => edge('bottom', bottom, inches, (value, limit) => value < limit - nothing, 'under');
  const large = area > nineSquareFeet + nothing;

  return [
    {
      rule: 'R308.4.1 doors',
      conditions: [yesNo(place.door, 'the unit is in a door', 'whether it is in a door', 'It is not in a door.')],
      categoryTwo: true,
    },
    {
      rule: 'R308.4.2 beside doors',
      conditions: [
        yesNo(
          place.nearDoor,
          'within 24 in (610 mm) of a door',
          'whether a door is within 24 in (610 mm)',
          'No door is within 24 in (610 mm).',
        ),
        bottomUnder(60),
      ],
      categoryTwo: large,
    },
    {
      rule: 'R308.4.3 windows',
      conditions: [
        {
          answer: large,
          met: `${area.toFixed(2)} m² is over 9 ft² (0.84 m²)`,
          asks: 'its area',
          unmet: `${area.toFixed(2)} m² is not over 9 ft² (0.84 m²).`,
        },
        bottomUnder(18),
        edge('top', top, 36, (value, limit) => value > limit + nothing, 'over'),
        {
          answer: place.walkingSurface === undefined ? undefined : place.walkingSurface <= 36 * inch + nothing,
          met: 'a walking surface within 36 in (914 mm)',
          asks: 'how far the nearest walking surface is',
          unmet: 'No walking surface is within 36 in (914 mm).',
        },
      ],
      categoryTwo: true,
    },
    {
      rule: 'R308.4.5 wet areas',
      conditions: [
        yesNo(
          place.wetArea,
          'within 60 in (1 524 mm) of a bath, shower or pool',
          'whether water is within 60 in (1 524 mm)',
          'No bath, shower or pool is within 60 in (1 524 mm).',
        ),
        bottomUnder(60),
      ],
      categoryTwo: large,
    },
    {
      rule: 'R308.4.6 stairs and ramps',
      conditions: [
        yesNo(
          place.stairs,
          'within 36 in (914 mm) of stairs, a ramp or a landing',
          'whether stairs, a ramp or a landing are within 36 in (914 mm)',
          'No stairs, ramp or landing are within 36 in (914 mm).',
        ),
        bottomUnder(36),
      ],
      categoryTwo: large,
    },
    {
      rule: 'R308.4.7 foot of stairs',
      // A bottom edge that is known to be high lets it off; one that is not known does not.
      conditions: [
        yesNo(
          place.footOfStairs,
          'within 60 in (1 524 mm) of the bottom tread',
          'whether a bottom tread is within 60 in (1 524 mm)',
          'No bottom tread is within 60 in (1 524 mm).',
        ),
        ...(bottom === undefined ? [] : [bottomUnder(36)]),
      ],
      categoryTwo: large,
    },
  ];
}

function yesNo(answer: Answer, met: string, asks: string, unmet: string): Condition {
  return { answer, met, asks, unmet };
}

function edge(
  which: 'bottom' | 'top',
  metres: number | undefined,
  inches: number,
  holds: (value: number, limit: number) => boolean,
  word: string,
): Condition {
  const limit = inches * inch;
  const bound = `${inches} in (${Math.round(limit * 1000)} mm)`;
  const at = metres === undefined ? '' : `${which} edge ${(metres / inch).toFixed(1)} in (${Math.round(metres * 1000)} mm) above the floor`;
  return {
    answer: metres === undefined ? undefined : holds(metres, limit),
    met: `${at}, ${word} ${bound}`,
    asks: `the height of the ${which} edge`,
    unmet: `${capital(at)}, not ${word} ${bound}.`,
  };
}

function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}

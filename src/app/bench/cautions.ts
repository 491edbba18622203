import { type Catalogue } from '@shared/contracts/catalogue';
import { type Evaluation } from '@shared/contracts/evaluation';
import { formatAltitude, formatArea } from '@shared/measures/format-quantity';
import { type MeasureSystem } from '@shared/measures/parse-length';

/** A caution at the place it is about: bold word, sentences, and what was checked in detail. */
export interface Caution {
  lead: string;
  text: string;
  /** one line each */
  details: string[];
  /** asks for something to be done, or only says what is known */
  tone: 'caution' | 'remark';
}

const EDITION = 'IRC 2015 to 2021';
const DEFERRING = 'Exceptions exist; the local code and a licensed professional decide.';

/**
 * What the place asks for: safety glazing, altitude. None of them ever says that a unit is safe:
 * what is not triggered is said to be no more than that.
 *
 * @param altitude of the site, m above sea level; undefined where it is not known
 */
export function placeCautions(
  { safety, geometry, buildability }: Evaluation,
  altitude: number | undefined,
  { fabricators }: Pick<Catalogue, 'fabricators'>,
  system: MeasureSystem,
): Caution[] {
  return [
    ...(safety.length > 0 ? [safetyCaution(safety, geometry.area, system)] : []),
    ...(altitude === undefined ? [] : altitudeCautions(buildability, altitude, fabricators, system)),
  ];
}

function safetyCaution(safety: Evaluation['safety'], area: number, system: MeasureSystem): Caution {
  const asked = safety.filter(({ verdict }) => verdict === 'safety glazing asked for');
  const open = safety.filter(({ verdict }) => verdict === 'cannot tell').length;
  const wanted = asked.map(({ rule, trigger }) => `${rule} (${EDITION}) asks for it: ${lower(inSystem(trigger, area, system))}`);
  // Category II wherever one of the rules asks for it.
  const strictest = asked.find(({ satisfiedBy }) => satisfiedBy.includes('Category II')) ?? asked[0];
  const unknown =
    open === 0
      ? ''
      : asked.length > 0
        ? `${open} more of ${safety.length} rules cannot be told from your answers.`
        : `Cannot tell yet: ${open} of the ${safety.length} rules of R308.4 (${EDITION}) need to know where it goes.`;
  const none =
    asked.length === 0 && open === 0
      ? `By your answers none of the ${safety.length} rules of R308.4 (${EDITION}) that are checked asks for it; that alone does not make it safe.`
      : '';
  return {
    lead: 'Safety glazing.',
    text: [...wanted, ...(strictest ? [metWords(strictest)] : []), unknown, none, DEFERRING].filter((part) => part !== '').join(' '),
    details: [...safety.map(({ rule, verdict, trigger }) => `${rule}: ${verdict}. ${trigger}`), safety[0]?.caution ?? ''],
    tone: asked.length > 0 || open > 0 ? 'caution' : 'remark',
  };
}

function metWords({ satisfied, satisfiedBy }: Evaluation['safety'][number]): string {
  if (satisfied === true) return 'Every lite is of such glass; it must be marked as such.';
  if (satisfied === false) return `This unit is not. What would do: ${lower(satisfiedBy)}`;
  return `Whether this unit meets it hangs on which lites can be reached. What would do: ${lower(satisfiedBy)}`;
}

/** What weather, wind and snow do to the lites, as far as it is screened. */
export function loadCaution({ load }: Evaluation): Caution {
  const { warnings, statement, stress, method, climate } = load;
  const own = warnings.filter((warning) => !statement?.includes(warning));
  const highest = stress.reduce<(typeof stress)[number] | null>(
    (worst, lite) => (!worst || lite.stressMpa / lite.allowableMpa > worst.stressMpa / worst.allowableMpa ? lite : worst),
    null,
  );
  const found =
    highest && highest.stressMpa <= highest.allowableMpa
      ? `Lite ${highest.lite} comes to ${highest.stressMpa.toFixed(1)} of ${highest.allowableMpa} MPa by this screen.`
      : '';
  const details = [
    ...stress.map(
      ({ lite, stressMpa, allowableMpa, deflectionMm }) =>
        `Lite ${lite}: ${stressMpa.toFixed(1)} MPa, allowed ${allowableMpa} MPa; bends ${deflectionMm.toFixed(1)} mm.`,
    ),
    ...(climate ? [`Sealed gas: summer ${signed(climate.summer)} kPa, winter ${signed(climate.winter)} kPa.`] : []),
    `${method.name}. Boundary: ${method.boundary}. Leaves out: ${method.leavesOut}.`,
  ];
  return {
    lead: 'Loads.',
    text: [...own, found, statement ?? ''].filter((part) => part !== '').join(' '),
    details,
    tone: own.length > 0 ? 'caution' : 'remark',
  };
}

/** One note for all makers whose advice is the same, with the climb from each plant. */
function altitudeCautions(
  buildability: Evaluation['buildability'],
  altitude: number,
  fabricators: Catalogue['fabricators'],
  system: MeasureSystem,
): Caution[] {
  const climbs = new Map<string, string[]>();
  for (const { fabricator, advice } of buildability) {
    const maker = fabricators.find(({ id }) => id === fabricator.id);
    for (const sentence of maker ? advice : []) {
      // The first sentence of an advice says how high; it is said for all of them together.
      const what = sentence.slice(sentence.indexOf('. ') + 2);
      const climb = altitude - maker!.plantAltitude;
      const words = `${formatAltitude(Math.abs(climb), system)} ${climb > 0 ? 'above' : 'below'} ${maker!.name}`;
      climbs.set(what, [...(climbs.get(what) ?? []), words]);
    }
  }
  return [...climbs].map(([what, words]) => ({
    lead: 'Altitude.',
    text: `The site lies ${words.join(', ')}. ${what}`,
    details: [],
    tone: 'caution',
  }));
}

/** Where a text gives both measures, `14 in (356 mm)`, that of the reader; the area of the unit likewise. */
function inSystem(text: string, area: number, system: MeasureSystem): string {
  return text
    .replace(`${area.toFixed(2)} m²`, formatArea(area, system))
    .replace(/([\d.]+ (?:in|ft²)) \(([\d .]+ (?:mm|m²))\)/g, system === 'imperial' ? '$1' : '$2');
}

function lower(text: string): string {
  return text.charAt(0).toLowerCase() + text.slice(1);
}

function signed(value: number): string {
  return `${value < 0 ? '−' : '+'}${Math.abs(value).toFixed(1)}`;
}

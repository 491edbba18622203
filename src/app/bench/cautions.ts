import { type Evaluation } from '@shared/contracts/evaluation';

/** A caution at the place it is about: bold word, sentences, and what was checked in detail. */
export interface Caution {
  lead: string;
  text: string;
  /** one line each */
  details: string[];
  /** asks for something to be done, or only says what is known */
  tone: 'caution' | 'remark';
}

/**
 * What the engineering warns of, in the order of harm: safety glazing, loads, altitude. None of
 * them ever says that a unit is safe: what is not triggered is said to be no more than that.
 */
export function cautionsOf({ safety, load, buildability }: Evaluation): Caution[] {
  return [...safetyCautions(safety), ...loadCautions(load), ...altitudeCautions(buildability)];
}

function safetyCautions(safety: Evaluation['safety']): Caution[] {
  const details = safety.map(({ rule, verdict, trigger }) => `${rule}: ${verdict}. ${trigger}`);
  const asked = safety.filter(({ verdict }) => verdict === 'safety glazing asked for');
  const unknown = safety.filter(({ verdict }) => verdict === 'cannot tell');
  const deferring = safety[0]?.caution ?? '';
  const edition = 'IRC 2015 to 2021';
  const cautions: Caution[] = asked.map(({ rule, trigger, satisfiedBy, satisfied }) => ({
    lead: 'Safety glazing.',
    text: `${rule} (${edition}) asks for it: ${lower(trigger)} ${met(satisfied)}${satisfiedBy} ${deferring}`,
    details,
    tone: 'caution',
  }));
  if (unknown.length > 0) {
    cautions.push({
      lead: 'Safety glazing: cannot tell.',
      text: `Say where it goes, and ${unknown.length} of the ${safety.length} rules of R308.4 (${edition}) that are open can be checked. ${deferring}`,
      details,
      tone: asked.length > 0 ? 'remark' : 'caution',
    });
  } else if (asked.length === 0 && safety.length > 0) {
    cautions.push({
      lead: 'Safety glazing.',
      text: `By your answers, none of the ${safety.length} rules of R308.4 (${edition}) that are checked here asks for it. That does not make it safe: ${lower(deferring)}`,
      details,
      tone: 'remark',
    });
  }
  return cautions;
}

function met(satisfied: boolean | null): string {
  if (satisfied === true) return 'Every lite of this unit is such glass; it must be marked. It wants: ';
  if (satisfied === false) return 'This unit is not such glass. What would do: ';
  return 'Whether this unit meets it depends on marks and on which lites can be reached. It wants: ';
}

function loadCautions({ warnings, statement, stress, method, climate }: Evaluation['load']): Caution[] {
  const own = warnings.filter((warning) => !statement?.includes(warning));
  const over = stress.some(({ stressMpa, allowableMpa }) => stressMpa > allowableMpa);
  const highest = stress.reduce<(typeof stress)[number] | null>(
    (worst, lite) => (!worst || lite.stressMpa / lite.allowableMpa > worst.stressMpa / worst.allowableMpa ? lite : worst),
    null,
  );
  const found =
    highest && !over ? `Lite ${highest.lite} comes to ${highest.stressMpa.toFixed(1)} of ${highest.allowableMpa} MPa by this screen.` : '';
  const details = [
    ...stress.map(
      ({ lite, stressMpa, allowableMpa, deflectionMm }) =>
        `Lite ${lite}: ${stressMpa.toFixed(1)} MPa, allowed ${allowableMpa} MPa; bends ${deflectionMm.toFixed(1)} mm.`,
    ),
    ...(climate ? [`Sealed gas: summer ${signed(climate.summer)} kPa, winter ${signed(climate.winter)} kPa.`] : []),
    `${method.name}. Boundary: ${method.boundary}. Leaves out: ${method.leavesOut}.`,
  ];
  return [
    {
      lead: 'Loads.',
      text: [...own, found, statement ?? ''].filter((part) => part !== '').join(' '),
      details,
      tone: own.length > 0 ? 'caution' : 'remark',
    },
  ];
}

function altitudeCautions(buildability: Evaluation['buildability']): Caution[] {
  const advice = [...new Set(buildability.flatMap((maker) => maker.advice))];
  return advice.length === 0 ? [] : [{ lead: 'Altitude.', text: advice.join(' '), details: [], tone: 'caution' }];
}

function lower(text: string): string {
  return text.charAt(0).toLowerCase() + text.slice(1);
}

function signed(value: number): string {
  return `${value < 0 ? '−' : '+'}${Math.abs(value).toFixed(1)}`;
}

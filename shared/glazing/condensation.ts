import type { Evaluation } from '../contracts/evaluation';
import type { Place } from '../contracts/units';

/** Inside surface resistance used for the surface temperature, m²K/W. */
const insideResistance = 0.13;
/** The winter day taken when the place names none, °C. */
export const usual = { inside: 20, outside: -10 };

/** Saturation pressure of water vapour at θ °C, Pa: ISO 13788 (from memory). */
export function saturationPressure(celsius: number): number {
  return celsius >= 0 ? 610.5 * Math.exp((17.269 * celsius) / (237.3 + celsius)) : 610.5 * Math.exp((21.875 * celsius) / (265.5 + celsius));
}

/** Dew point in °C of air at θ °C and relative humidity above 0 up to 1: the inverse of `saturationPressure`. */
export function dewPoint(celsius: number, humidity: number): number {
  const ratio = Math.log((saturationPressure(celsius) * humidity) / 610.5);
  return ratio >= 0 ? (237.3 * ratio) / (17.269 - ratio) : (265.5 * ratio) / (21.875 - ratio);
}

/** Whether and when the centre fogs on the room side. `u` in W/(m²·K). */
export function condensationOf(u: number, place: Place): Evaluation['condensation'] {
  const inside = place.insideTemperature ?? usual.inside;
  const outside = place.outsideTemperature ?? usual.outside;
  const humidity = place.insideHumidity;
  const method = {
    name: 'ISO 13788:2012',
    boundary: `inside ${inside} °C${humidity === undefined ? '' : `, ${Math.round(humidity * 100)} %`}, outside ${outside} °C, inside 0.13 m²K/W, U-value by EN 673`,
    leavesOut: 'the edge, which is always colder than the centre; frame, curtains and draughts; fog on the outside',
  };
  if (outside >= inside) {
    const statement = 'The outside is not colder than the room, so the glass does not cool the room air.';
    return { applies: false, statement, method, insideSurface: null, dewPoint: null, foggingHumidity: null, fogs: null };
  }
  const insideSurface = inside - u * (inside - outside) * insideResistance;
  const known = humidity !== undefined && humidity > 0 ? dewPoint(inside, humidity) : null;
  return {
    applies: true,
    statement:
      humidity === undefined
        ? 'The humidity of the room is not given, so this does not say whether it fogs. The edge fogs before the centre.'
        : 'The edge fogs before the centre.',
    method,
    insideSurface,
    dewPoint: known,
    foggingHumidity: saturationPressure(insideSurface) / saturationPressure(inside),
    fogs: humidity === undefined ? null : known !== null && known >= insideSurface,
  };
}

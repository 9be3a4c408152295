import { NUMBER_SPACE, superscript } from './format-number';

const SPELLED: Record<string, string> = {
  degC: '°C',
  degF: '°F',
  degR: '°R',
  um: 'µm',
  uPa: 'µPa',
  uL: 'µL',
  umol: 'µmol',
  ug: 'µg',
  us: 'µs',
  ohm: 'Ω',
  deg: '°',
  percent: '%',
};

/** A unit as it is set in print: `kg/(m^2 s)` becomes `kg/(m² s)`, `degC` becomes `°C`, none becomes an empty text. */
export function formatUnit(unit: string): string {
  if (unit === '1' || unit === '') return '';
  return unit
    .replace(/[A-Za-z]+/g, (name) => SPELLED[name] ?? name)
    .replace(/\^\(?(-?\d+)\)?/g, (_whole, exponent: string) => superscript(Number(exponent)))
    .replace(/\*/g, '\u00b7')
    .replace(/ /g, NUMBER_SPACE);
}

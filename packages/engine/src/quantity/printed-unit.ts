const SPELLED: Readonly<Record<string, string>> = {
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
const RAISED = '⁰¹²³⁴⁵⁶⁷⁸⁹';

/** A unit as it is set in print: `kg/(m^2 s)` becomes `kg/(m² s)`, `degC` becomes `°C`, none becomes an empty text. */
export function printedUnit(unit: string, space = '\u2009'): string {
  if (unit === '1' || unit === '') return '';
  return unit
    .replace(/[A-Za-z]+/g, (name) => SPELLED[name] ?? name)
    .replace(/\^\(?(-?\d+)\)?/g, (_whole, exponent: string) => raised(exponent))
    .replace(/\*/g, '\u00b7')
    .replace(/ /g, space);
}

function raised(exponent: string): string {
  return [...exponent].map((figure) => (figure === '-' ? '⁻' : (RAISED[Number(figure)] ?? ''))).join('');
}

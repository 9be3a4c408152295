import { sameDimension } from './dimension.js';
import { fromSI, measuresSame, readUnit, toSI } from './unit.js';

/** Units that people of this trade write, offered where the dimension fits. */
export const OFFERED = [
  '1',
  '%',
  'm',
  'mm',
  'cm',
  'um',
  'nm',
  'in',
  'ft',
  'm^2',
  'cm^2',
  'ft^2',
  'm^3',
  'l',
  's',
  'min',
  'h',
  'm/s',
  'cm/s',
  'mm/s',
  'm/h',
  'm/d',
  'cm/h',
  'ft/s',
  'ft/h',
  'km/h',
  'K',
  'degC',
  'degF',
  'Pa',
  'kPa',
  'bar',
  'MPa',
  'atm',
  'mmHg',
  'psi',
  'kPa(g)',
  'bar(g)',
  'psi(g)',
  'kg/m^3',
  'g/cm^3',
  'lb/ft^3',
  'Pa s',
  'mPa s',
  'uPa s',
  'cP',
  'm^2/s',
  'cm^2/s',
  'mm^2/s',
  'ft^2/h',
  'N/m',
  'mN/m',
  'dyn/cm',
  '1/m',
  '1/cm',
  '1/ft',
  'kg/(m^2 s)',
  'kg/(m^2 h)',
  'lb/(ft^2 h)',
  'kg/(m s)',
  'kg/s',
  'kg/h',
  'lb/h',
  'm^3/s',
  'm^3/h',
  'l/min',
  'gpm',
  'cfm',
  'm^2/h',
  'W',
  'kW',
  'W/m^3',
  'kW/m^3',
  'W/kg',
  'mW/kg',
  'kg/mol',
  'g/mol',
  'mol/m^3',
  'kmol/m^3',
  'mol/l',
  'mol/(m^2 s)',
  'kmol/(m^2 s)',
  'mol/(m^2 h)',
  'mol/(m^3 s)',
  'kmol/(m^3 s)',
  'mol/(m^2 s Pa)',
  'kmol/(m^2 s kPa)',
  'kmol/(m^2 s atm)',
  'mol/(m^3 s Pa)',
  '1/s',
  '1/min',
  '1/h',
  'rad/s',
  'rpm',
  'm/s^2',
  'rad',
  'deg',
  'm^3/mol',
  'cm^3/mol',
  'J/(mol K)',
  'J/kg',
  'kJ/kg',
] as const;

/** What a picker has to know of a quantity beside its dimension. */
interface UnitKind {
  difference?: boolean;
  absolutePressure?: boolean;
  fraction?: boolean;
  offered?: readonly string[];
}

/** Units that a value in `unit` can be put in, the sheet's own first. */
export function unitsFor(unit: string, kind: UnitKind = {}): string[] {
  const own = readUnit(unit);
  if (!own.ok) return [unit];
  const fits = (kind.offered ?? OFFERED).filter((offered) => {
    const reading = readUnit(offered);
    if (!reading.ok || !sameDimension(reading.unit.dimension, own.unit.dimension)) return false;
    if (offered === '%') return kind.fraction === true;
    // Angular speed and frequency share a dimension and differ by 2π: neither is offered for the other.
    if (reading.unit.offset === 0) return reading.unit.angular === own.unit.angular;
    return offered.includes('(g)') ? kind.absolutePressure === true : kind.difference !== true;
  });
  return [unit, ...fits.filter((offered) => offered !== unit)];
}

/**
 * The unit a form starts with for a quantity of a sheet: the usual one of its kind, else the SI one; a sheet's own
 * (m/h, lb/ft^3) is that of its formula and not of the people who use it.
 */
export function usualUnitFor(unit: string, kind: UnitKind & { usual?: string; unit?: string } = {}): string {
  const usual = kind.usual ?? kind.unit;
  return usual !== undefined && unitsFor(unit, kind).includes(usual) ? usual : unit;
}

/** Converts a number between two units of one dimension; null where they do not fit. */
export function convert(value: number, from: string, to: string): number | null {
  const a = readUnit(from);
  const b = readUnit(to);
  if (!a.ok || !b.ok || !measuresSame(a.unit, b.unit)) return null;
  if (a.unit.factor === b.unit.factor && a.unit.offset === b.unit.offset) return value;
  return fromSI(toSI(value, a.unit), b.unit);
}

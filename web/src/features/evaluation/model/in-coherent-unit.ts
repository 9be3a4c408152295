import { convert } from '@merestone/engine';

/** The units in which coefficients and areas are compared. */
const COHERENT = ['m/s', '1/s', '1/m', 'mol/(m^2 s)', 'mol/(m^2 s Pa)'];

/** A value of a published dimensional formula in the coherent unit; null where it is in that unit already. */
export function inCoherentUnit(value: number, unit: string): { value: number; unit: string } | null {
  for (const wanted of COHERENT) {
    const converted = unit === wanted ? null : convert(value, unit, wanted);
    if (converted !== null) return { value: converted, unit: wanted };
  }
  return null;
}

import { serves, type Quantity } from '@merestone/engine';

/** The quantity of a sheet that serves as an input of a property equation: of the same name, else one that covers it. */
export function servingQuantity(quantities: readonly Quantity[], wanted: string): Quantity | undefined {
  return quantities.find((q) => q.is === wanted) ?? quantities.find((q) => serves(q.is, wanted));
}

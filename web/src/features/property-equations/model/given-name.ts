import { QUANTITIES } from '@merestone/engine';

/** What a property equation gives, in the words of the quantity dictionary. */
export function givenName(gives: string): string {
  const words = gives.replaceAll('-', ' ');
  return QUANTITIES[gives]?.title ?? words.charAt(0).toUpperCase() + words.slice(1);
}

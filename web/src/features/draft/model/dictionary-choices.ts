import { GROUPS, QUANTITIES } from '@merestone/engine';
import { formatUnit } from '../../../shared/format/format-unit';
import { symbolText } from '../../../shared/format/symbol-parts';
import type { SearchChoice } from './matching';

/** The quantity dictionary, to be searched by title. */
export const DICTIONARY_CHOICES: readonly SearchChoice[] = Object.entries(QUANTITIES)
  .map(([value, { title, unit, symbol }]) => ({
    value,
    label: title,
    detail: `${symbolText(symbol)}, ${formatUnit(unit) || 'without unit'}`,
  }))
  .sort((a, b) => a.label.localeCompare(b.label));

/** The dictionary of groups, to be searched by name or symbol. */
export const GROUP_CHOICES: readonly SearchChoice[] = GROUPS.map(({ symbol, name, expression }) => ({
  value: symbol,
  label: `${symbolText(symbol)}, ${name}`,
  detail: expression,
}));

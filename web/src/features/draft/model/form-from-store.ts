import type { CslItem } from '@merestone/engine';
import type { DraftForm } from './draft-form';
import {
  emptyBound,
  emptyCheck,
  emptyForm,
  emptyGroup,
  emptyIntermediate,
  emptyPart,
  emptyPiece,
  emptyQuantity,
  emptySentence,
  emptySource,
  emptyTable,
  emptyTableRow,
  newRowId,
} from './empty-rows';

/** A form in which every list holds one row, and every list within a row as well: the shape of all that may be kept. */
function fullShape(): DraftForm {
  const part = emptyPart();
  const value = { symbol: '', value: '', unit: '' };
  const bound = emptyBound();
  return {
    ...emptyForm(),
    quantities: [{ ...emptyQuantity(), equations: [''] }],
    tables: [{ ...emptyTable(), rows: [{ ...emptyTableRow(), values: [{ symbol: '', text: '' }] }] }],
    groups: [emptyGroup()],
    intermediates: [{ ...emptyIntermediate(), pieces: [emptyPiece()] }],
    bounds: [
      {
        ...bound,
        stretches: bound.stretches.map(({ lo, hi, ...rest }) => ({
          ...rest,
          lo: { ...lo, beyond: [''] },
          hi: { ...hi, beyond: [''] },
        })),
      },
    ],
    parts: [{ ...part, result: { ...part.result, pieces: [emptyPiece()] } }],
    restrictions: [emptySentence()],
    cautions: [emptySentence()],
    sources: [emptySource()],
    checks: [
      {
        ...emptyCheck(),
        inputs: [value],
        expected: [value],
        rows: [{ name: '', key: '' }],
        equations: [{ symbol: '', slug: '' }],
      },
    ],
  };
}

/**
 * A form as a browser has kept it. What has not the shape that the form has today is left at its empty value, so that
 * nothing kept by an earlier version, or by somebody else, can break the page. Rows get new names.
 */
export function formFromStore(value: unknown): DraftForm {
  return shapedLike(fullShape(), value) as DraftForm;
}

function shapedLike(model: unknown, value: unknown): unknown {
  if (Array.isArray(model)) {
    const exemplar = (model as unknown[])[0];
    return Array.isArray(value) ? value.map((one) => shapedLike(exemplar, one)) : [];
  }
  if (!isRecord(model)) return typeof value === typeof model ? value : model;
  const given = isRecord(value) ? value : {};
  return Object.fromEntries(
    Object.entries(model).map(([member, own]): [string, unknown] => {
      if (member === 'id') return [member, newRowId()];
      if (member === 'kept') return [member, citationFrom(given.kept) ?? own];
      return [member, shapedLike(own, given[member])];
    }),
  );
}

/** A citation is kept with all its members; the form looks only at those it knows. */
function citationFrom(value: unknown): CslItem | null {
  return isRecord(value) && typeof value.type === 'string' ? { ...value, type: value.type } : null;
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

import { registerDecorator } from 'class-validator';
import { AsGiven } from '../../common/as-given.js';
import { ApiProblem, type FieldProblem } from '../../common/problem.js';
import { inputMapProblems, nameMapProblems } from './read-map.js';

/** A map of values by symbol, or by dictionary name. */
export function IsInputMap(keys: 'symbols' | 'names' = 'symbols') {
  return mapDecorator('isInputMap', (field, value) => inputMapProblems(field, value, keys));
}

/** A map of names. */
export function IsNameMap() {
  return mapDecorator('isNameMap', nameMapProblems);
}

/** Throws its own problem: each key has a fault of its own, and a validator's message has room for one sentence. */
function mapDecorator(name: string, problemsOf: (field: string, value: unknown) => FieldProblem[]) {
  return (target: object, propertyName: string): void => {
    AsGiven()(target, propertyName);
    registerDecorator({
      name,
      target: target.constructor,
      propertyName,
      validator: {
        validate(value: unknown): boolean {
          const fields = problemsOf(propertyName, value);
          const [first] = fields;
          if (first === undefined) return true;
          if (first.field === propertyName) return false;
          const detail =
            fields.length === 1 ? 'One field cannot be used.' : `${fields.length} fields cannot be used.`;
          throw new ApiProblem(first.code === 'unknown-symbol' ? 'unknown-symbol' : 'malformed', detail, {
            fields,
          });
        },
        defaultMessage: (args) => problemsOf(propertyName, args?.value)[0]?.message ?? 'must be an object.',
      },
    });
  };
}

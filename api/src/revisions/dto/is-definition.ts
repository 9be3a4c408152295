import { registerDecorator } from 'class-validator';
import { AsGiven } from '../../common/as-given.js';
import { readCorrelation } from '../definition-check.js';

/**
 * Holds a sheet's definition against the engine's structural check and compiler. The problem is thrown from here,
 * since a definition may have many faults, each with its path, and a validator's message has room for one sentence.
 */
export function IsCorrelationDefinition() {
  return (target: object, propertyName: string): void => {
    AsGiven()(target, propertyName);
    registerDecorator({
      name: 'isCorrelationDefinition',
      target: target.constructor,
      propertyName,
      validator: {
        validate(value: unknown): boolean {
          if (typeof value !== 'object' || value === null) return false;
          readCorrelation(value);
          return true;
        },
        defaultMessage: () => 'must be the definition of a sheet',
      },
    });
  };
}

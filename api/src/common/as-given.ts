import { Transform } from 'class-transformer';

/**
 * Takes a field's value as it came. Left alone, class-transformer copies objects and leaves out, without a word, every
 * key that names a method of all objects, such as `toString`: a map from outside must be checked with all its keys.
 */
export const AsGiven = () =>
  Transform(({ obj, key }: { obj: Record<string, unknown>; key: string }) => obj[key], { toClassOnly: true });

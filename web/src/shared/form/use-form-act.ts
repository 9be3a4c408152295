import { useState, type SyntheticEvent } from 'react';
import type { ApiProblem } from '../api/api-problem';
import { sentence } from '../format/sentence';
import { useAct } from '../hooks/use-act';

/** What is wrong, by the name of the field in the request. */
export type FieldErrors = Readonly<Record<string, string | undefined>>;

interface FormActOptions {
  /** What can be seen to be wrong before anything is sent. */
  find?: () => FieldErrors;
  act: () => Promise<void>;
}

/** A form with one act: faults are found first, and what the server refuses comes back at its fields. */
export function useFormAct({ find = () => ({}), act }: FormActOptions) {
  const [found, setFound] = useState<FieldErrors>({});
  const { working, problem, run, forget } = useAct();
  const send = (event?: SyntheticEvent) => {
    event?.preventDefault();
    const faults = find();
    setFound(faults);
    if (Object.values(faults).some((message) => message !== undefined)) forget();
    else void run(act);
  };
  return { errors: problem ? errorsOf(problem) : found, problem, working, send };
}

export type FormAct = Pick<ReturnType<typeof useFormAct>, 'errors' | 'problem'>;

/** The server's words by field; a place inside a list (`geometries.3`) counts for the whole list. */
function errorsOf({ fields }: ApiProblem): FieldErrors {
  const byField: Record<string, string> = {};
  for (const { field, message } of fields) {
    const [name = field] = field.split('.');
    byField[name] ??= sentence(message);
  }
  return byField;
}

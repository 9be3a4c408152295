import { useState, type SyntheticEvent } from 'react';
import { asApiProblem, type ApiProblem } from '../api/api-problem';
import { sentence } from '../format/sentence';

/** What is wrong, by the name of the field in the request. */
export type FieldErrors = Readonly<Record<string, string | undefined>>;

interface FormActOptions {
  /** What can be seen to be wrong before anything is sent. */
  find?: () => FieldErrors;
  act: () => Promise<void>;
}

/** A form with one act: faults are found first, and what the server refuses comes back at its fields. */
export function useFormAct({ find = () => ({}), act }: FormActOptions) {
  const [errors, setErrors] = useState<FieldErrors>({});
  const [problem, setProblem] = useState<ApiProblem | null>(null);
  const [working, setWorking] = useState(false);

  const send = async () => {
    const found = find();
    setErrors(found);
    setProblem(null);
    if (Object.values(found).some((message) => message !== undefined)) return;
    setWorking(true);
    try {
      await act();
    } catch (thrown) {
      const refusal = asApiProblem(thrown);
      setProblem(refusal);
      setErrors(errorsOf(refusal));
    }
    setWorking(false);
  };

  return {
    errors,
    problem,
    working,
    send: (event?: SyntheticEvent) => {
      event?.preventDefault();
      void send();
    },
  };
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

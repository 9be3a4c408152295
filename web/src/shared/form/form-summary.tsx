import { ErrorSummary, type SummaryError } from '../ui/error-summary';
import type { FormAct } from './use-form-act';

interface FormSummaryProps {
  /** What has not happened yet: `Nobody was invited yet`. */
  title: string;
  form: FormAct;
  /** Ids of the controls by field, in their order on the page; what is wrong elsewhere is said without a link. */
  ids: Readonly<Record<string, string>>;
}

/** Everything that keeps a form from being sent, or why the server would not have it. */
export function FormSummary({ title, form, ids }: FormSummaryProps) {
  const order = [...Object.keys(ids), ...Object.keys(form.errors)];
  const errors: SummaryError[] = [...new Set(order)].flatMap((field) => {
    const message = form.errors[field];
    const fieldId = ids[field];
    return message === undefined ? [] : [fieldId === undefined ? { message } : { fieldId, message }];
  });
  const { problem } = form;
  if (problem && errors.length === 0) errors.push({ message: problem.detail || problem.title });
  return <ErrorSummary title={title} errors={errors} />;
}

/** The id of the control for a field, so that an error summary can lead to it. */
export function fieldId(key: string): string {
  return `duty-${key.replace(/[^A-Za-z0-9_-]/g, '-')}`;
}

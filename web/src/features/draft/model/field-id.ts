/** The id of the control for a place in the definition: `groups[0].expression` becomes `draft-groups-0-expression`. */
export function draftFieldId(path: string): string {
  return `draft-${path.replace(/[^A-Za-z0-9_]+/g, '-').replace(/-$/, '')}`;
}

/** Ids to try for a path, from the field itself up to its row and its section. */
export function idsFor(path: string): string[] {
  const steps = path.split(/\.|(?=\[)/).filter(Boolean);
  return steps.map((_, i) =>
    draftFieldId(
      steps
        .slice(0, steps.length - i)
        .join('.')
        .replaceAll('.[', '['),
    ),
  );
}

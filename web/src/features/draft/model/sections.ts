/** The sections of the form, in the order in which an engineer thinks of a correlation. */
export const SECTIONS = [
  { key: 'head', title: 'What it is' },
  { key: 'symbols', title: 'Symbols' },
  { key: 'groups', title: 'Groups' },
  { key: 'steps', title: 'Steps and tables' },
  { key: 'equation', title: 'Equation' },
  { key: 'bounds', title: 'Where it holds' },
  { key: 'trust', title: 'Accuracy, restrictions, cautions' },
  { key: 'sources', title: 'Sources' },
  { key: 'checks', title: 'Worked checks' },
  { key: 'verification', title: 'Verification' },
] as const;
export type SectionKey = (typeof SECTIONS)[number]['key'];

const BY_MEMBER: Readonly<Record<string, SectionKey>> = {
  quantities: 'symbols',
  groups: 'groups',
  tables: 'steps',
  intermediates: 'steps',
  parts: 'equation',
  bounds: 'bounds',
  accuracy: 'trust',
  restrictions: 'trust',
  cautions: 'trust',
  sources: 'sources',
  checks: 'checks',
  verification: 'verification',
};

/** The section of the form in which a place of the definition is edited. */
export function sectionOf(path: string): SectionKey {
  return BY_MEMBER[/^[A-Za-z]+/.exec(path)?.[0] ?? ''] ?? 'head';
}

/** The id of a section on the page. */
export function sectionId(key: SectionKey): string {
  return `draft-section-${key}`;
}

import type { Difference } from '@merestone/engine';

type Field = Difference['section'];

/** The page's sections in the order of a sheet, and the fields of a definition that belong to each. */
const SECTIONS: readonly { title: string; fields: readonly Field[] }[] = [
  {
    title: 'What it is about',
    fields: [
      'title',
      'authors',
      'year',
      'geometry',
      'phase',
      'summary',
      'averaging',
      'wall',
      'drivingForce',
      'propertyState',
      'format',
    ],
  },
  { title: 'Equations', fields: ['intermediates', 'parts'] },
  { title: 'Where it holds', fields: ['bounds'] },
  { title: 'Groups', fields: ['groups'] },
  { title: 'Quantities', fields: ['quantities', 'tables'] },
  { title: 'Accuracy, restrictions and cautions', fields: ['accuracy', 'restrictions', 'cautions'] },
  { title: 'Sources', fields: ['sources'] },
  { title: 'Worked checks', fields: ['checks'] },
  { title: 'Verification', fields: ['verification'] },
];

export interface DifferenceSection {
  title: string;
  differences: Difference[];
}

/** Differences under the headings of a sheet; headings without any are left out. */
export function sectionsOf(differences: readonly Difference[]): DifferenceSection[] {
  return SECTIONS.map(({ title, fields }) => ({
    title,
    differences: differences.filter(({ section }) => fields.includes(section)),
  })).filter((section) => section.differences.length > 0);
}

/** `7 fields differ, in 3 sections.` */
export function countWords(differences: readonly Difference[]): string {
  if (differences.length === 0) return 'No field differs.';
  const sections = sectionsOf(differences).length;
  const fields = differences.length === 1 ? 'One field differs' : `${differences.length} fields differ`;
  return sections === 1 ? `${fields}.` : `${fields}, in ${sections} sections.`;
}

/** What somebody did, following their name. An act without words of its own here is shown by its code. */
const WORDS: Readonly<Record<string, string>> = {
  'office.founded': 'set up the office',
  'person.added': 'added a person',
  'session.started': 'signed in',
  'session.ended': 'signed out',
  'correlation.drafted': 'drafted a correlation',
  'revision.drafted': 'drafted a next revision',
  'revision.submitted': 'submitted a revision for review',
  'revision.taken-back': 'took a revision back for changes',
  'revision.taken-over': 'took over a draft of the library',
  'revision.commented': 'commented on a revision',
  'revision.reviewed': 'reviewed a revision',
  'revision.approved': 'approved a revision',
  'revision.superseded': 'superseded a revision',
  'revision.declined': 'declined a revision',
  'revision.suspended': 'suspended a revision',
  'revision.reinstated': 'reinstated a suspended revision',
  'revision.withdrawn': 'withdrew a revision',
  'evaluation.deviated': 'evaluated outside a bound',
  'property-equation.drafted': 'drafted a property equation',
  'geometries.added': 'added geometries',
};

export function actWords(act: string): string {
  return WORDS[act] ?? act.replace('.', ': ').replaceAll('-', ' ');
}

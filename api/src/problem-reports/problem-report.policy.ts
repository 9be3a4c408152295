import type { Actor } from '../common/actor.js';
import { ALLOWED, denied, type Decision } from '../common/authorized.js';
import { hasPermission } from '../common/permissions.js';
import { UNAPPROVED, type Standing } from '../common/standing.js';

/** A problem is reported on what is or was the office's word; what is still worked on is commented. */
export function mayReport(actor: Actor, revision: { readonly standing: Standing }): Decision {
  if (!hasPermission(actor.roles, 'problem-report.file'))
    return denied('This needs the permission problem-report.file.');
  return UNAPPROVED.includes(revision.standing)
    ? denied(`This revision is ${revision.standing}: comment on it in its review.`, 'conflict')
    : ALLOWED;
}

export function mayAnswerReport(actor: Actor, report: { readonly answer: object | null }): Decision {
  if (!hasPermission(actor.roles, 'problem-report.answer'))
    return denied('This needs the permission problem-report.answer.');
  return report.answer === null ? ALLOWED : denied('This report was answered already.', 'conflict');
}

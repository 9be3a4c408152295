import type { Actor } from '../common/actor.js';
import type { ProblemReport } from './dto/problem-report.dto.js';
import { mayAnswerReport } from './problem-report.policy.js';
import type { ReportRecord } from './problem-reports.repository.js';

export function problemReport(actor: Actor, record: ReportRecord): ProblemReport {
  const { id, slug, revision, hash, severity, text, byId, byName, at, answer } = record;
  return {
    id,
    slug,
    revision,
    hash,
    severity,
    text,
    by: { id: byId, name: byName },
    at,
    answer: answer && {
      outcome: answer.outcome,
      text: answer.text,
      by: { id: answer.byId, name: answer.byName },
      at: answer.at,
    },
    abilities: { answer: mayAnswerReport(actor, record).allowed },
  };
}

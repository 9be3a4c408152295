import { shortHash } from '../../../shared/ui/running-head';
import type { EvaluatedSheet } from '../model/evaluated-sheet';
import type { Shown } from '../model/shown-outcome';

interface ProvenanceProps {
  shown: Extract<Shown, { kind: 'preview' | 'kept' }>;
  sheet: EvaluatedSheet;
}

/** What the number was computed with, to the exact content, and the caution that always stands with it. */
export function Provenance({ shown, sheet }: ProvenanceProps) {
  return (
    <footer className="provenance">
      {shown.kind === 'kept' ? <KeptWith outcome={shown.outcome} /> : null}
      <p>{shown.kind === 'kept' ? shown.outcome.caution : sheet.caution}</p>
    </footer>
  );
}

function KeptWith({ outcome }: { outcome: Extract<Shown, { kind: 'kept' }>['outcome'] }) {
  const { slug, revision, hash, engine, equations, rows } = outcome.provenance;
  const parts = [
    `${slug} rev ${revision}, content ${shortHash(hash)}`,
    ...equations.map((e) => `${e.key} rev ${e.revision}, content ${shortHash(e.hash)}`),
    ...Object.entries(rows).map(([table, key]) => `${table}: ${key}`),
    `engine ${engine}`,
  ];
  return <p>Computed with {parts.join('; ')}.</p>;
}

import type { Standing } from '../api/types';
import './standing-word.css';

/** A revision's standing: its word in small capitals, with a rule under it (double: approved, single: in review). */
export function StandingWord({ standing }: { standing: Standing }) {
  return <span className={`standing standing-${standing.replace(' ', '-')}`}>{standing}</span>;
}

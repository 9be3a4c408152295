import type { ReactNode } from 'react';
import type { Standing } from '../api/types';
import { StandingWord } from './standing-word';
import './running-head.css';

interface RunningHeadProps {
  geometry: ReactNode;
  correlation: ReactNode;
  revision: number;
  standing: Standing;
  /** The whole content hash; its first twelve figures are shown. */
  hash: string;
}

/** The line on top of every sheet: which revision this is, and the start of its content hash. */
export function RunningHead({ geometry, correlation, revision, standing, hash }: RunningHeadProps) {
  return (
    <p className="running-head">
      <span className="running-head-geometry">{geometry}</span>
      <span>{correlation}</span>
      <span>rev {revision}</span>
      <StandingWord standing={standing} />
      <span className="running-head-hash" title={`SHA-256 of the sheet's content: ${hash}`}>
        <span className="heard-only">content hash </span>
        {shortHash(hash)}
      </span>
    </p>
  );
}

/** The first twelve figures in groups of four: `7f3a c19e 04b2`. */
export function shortHash(hash: string): string {
  return (
    hash
      .slice(0, 12)
      .match(/.{1,4}/g)
      ?.join('\u00a0') ?? hash
  );
}

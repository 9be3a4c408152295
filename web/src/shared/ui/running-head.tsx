import type { ReactNode } from 'react';
import type { Standing } from '../api/types';
import { StandingWord } from './standing-word';
import './running-head.css';

interface RunningHeadProps {
  geometry: ReactNode;
  correlation: ReactNode;
  /** Geometry and correlation in plain words, for the top of every printed page. */
  printed?: string;
  revision: number;
  standing: Standing;
  /** The whole content hash; its first twelve figures are shown. */
  hash: string;
}

/** The line on top of every sheet: which revision this is, and the start of its content hash. */
export function RunningHead({ geometry, correlation, printed, revision, standing, hash }: RunningHeadProps) {
  return (
    <p className="running-head">
      {printed === undefined ? null : (
        <style>{printedHead(`${printed} · rev ${revision} · ${standing} · ${shortHash(hash)}`)}</style>
      )}
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

/** The running head and the page number on paper; a page margin takes text only from a style. */
function printedHead(text: string): string {
  const quoted = text.replace(/["\\\n\r\f<]/g, ' ');
  return `@page { @top-left { content: "${quoted}"; } @bottom-right { content: counter(page) " / " counter(pages); } }`;
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

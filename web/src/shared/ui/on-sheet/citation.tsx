import { formatCitation, type Source } from '@merestone/engine';

/** A citation as a reference list has it, the place in the source behind it. */
export function Citation({ source }: { source: Source }) {
  const { before, work, after, doi } = formatCitation(source.csl);
  return (
    <>
      {before} <i>{work}</i>
      {after}; {source.place.replace(/\.$/, '')}.
      {doi ? (
        <>
          {' '}
          <a href={doi.href} rel="noreferrer" target="_blank">
            doi:{doi.name}
          </a>
        </>
      ) : null}
    </>
  );
}

import './notice.css';

/** Says that something is on its way; quiet for the first moments, so that fast answers do not flicker. */
export function Loading({ what }: { what: string }) {
  return (
    <p role="status" className="loading">
      Fetching {what} …
    </p>
  );
}

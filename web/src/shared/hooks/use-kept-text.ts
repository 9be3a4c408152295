import { useCallback, useState } from 'react';
import { useSession } from '../session/use-session';

const LONGEST = 20_000;

/**
 * A text that survives a reload until it is sent, kept in this browser for the person who typed it.
 * `name` says what it is about, such as `comment:<slug>/2:bounds[0]`.
 */
export function useKeptText(name: string) {
  const { session } = useSession();
  const key = `merestone:text:1:${session?.person.id ?? 'nobody'}:${name}`;
  const [held, setHeld] = useState(() => ({ key, text: read(key) }));
  // Another name is another text.
  const text = held.key === key ? held.text : read(key);

  const change = useCallback(
    (next: string) => {
      setHeld({ key, text: next });
      write(key, next);
    },
    [key],
  );
  const clear = useCallback(() => change(''), [change]);
  return { text, change, clear };
}

function read(key: string): string {
  try {
    return (window.localStorage.getItem(key) ?? '').slice(0, LONGEST);
  } catch {
    return '';
  }
}

/** A full or blocked store only means that a reload starts empty. */
function write(key: string, text: string): void {
  try {
    if (text === '') window.localStorage.removeItem(key);
    else window.localStorage.setItem(key, text);
  } catch {
    return;
  }
}

import { useEffect, useRef, type RefObject } from 'react';

/**
 * Takes the focus when it would otherwise fall to the top of the page, because the button that was pressed is gone.
 * Runs when the element appears and whenever `what` changes.
 */
export function useFocusWhenLost<T extends HTMLElement>(what: unknown): RefObject<T | null> {
  const element = useRef<T>(null);
  useEffect(() => {
    const focused = document.activeElement;
    if (what && (focused === null || focused === document.body)) element.current?.focus();
  }, [what]);
  return element;
}

import { useLayoutEffect, useRef, useState, type RefObject } from 'react';

/** The width an element has been given, in whole pixels; `fallback` until it is known. */
export function useElementWidth<T extends HTMLElement>(fallback: number): [RefObject<T | null>, number] {
  const element = useRef<T>(null);
  const [width, setWidth] = useState(fallback);
  useLayoutEffect(() => {
    const node = element.current;
    if (!node) return;
    const read = () => {
      const given = Math.floor(node.getBoundingClientRect().width);
      if (given > 0) setWidth(given);
    };
    read();
    const observer = new ResizeObserver(read);
    observer.observe(node);
    return () => observer.disconnect();
  }, []);
  return [element, width];
}

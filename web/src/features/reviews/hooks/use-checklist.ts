import { useCallback, useMemo } from 'react';
import type { Checklist } from '../../../shared/api/types';
import { useKeptText } from '../../../shared/hooks/use-kept-text';
import { CHECKLIST } from '../model/review-words';

/** The points a reviewer has ticked off for one content; kept on a reload, and none for other content. */
export function useChecklist(name: string, hash: string) {
  const { text, change, clear } = useKeptText(`checklist:${name}:${hash}`);
  const ticked = useMemo(() => new Set(text.split(' ')), [text]);
  const checklist = useMemo(
    () => Object.fromEntries(CHECKLIST.map(({ point }) => [point, ticked.has(point)])) as Checklist,
    [ticked],
  );
  const tick = useCallback(
    (point: keyof Checklist, done: boolean) =>
      change(
        CHECKLIST.map((one) => one.point)
          .filter((one) => (one === point ? done : ticked.has(one)))
          .join(' '),
      ),
    [change, ticked],
  );
  return { checklist, tick, clear };
}

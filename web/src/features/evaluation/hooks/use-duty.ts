import { useEffect, useReducer } from 'react';
import { EMPTY_DUTY, changeDuty, type Duty, type DutyChange } from '../model/duty';
import { readStoredDuty, storeDuty } from '../model/stored-duty';

/** The duty being typed, kept in this browser under the key, so that a reload loses nothing. */
export function useDuty(storageKey: string): [Duty, (change: DutyChange) => void] {
  const [duty, change] = useReducer(changeDuty, storageKey, (key) =>
    readStoredDuty(window.localStorage, key),
  );
  useEffect(() => {
    storeDuty(window.localStorage, storageKey, duty);
  }, [storageKey, duty]);
  return [duty, change];
}

/** Whether there is anything that starting anew would clear. */
export function hasContent(duty: Duty): boolean {
  return duty !== EMPTY_DUTY && JSON.stringify(duty) !== JSON.stringify(EMPTY_DUTY);
}

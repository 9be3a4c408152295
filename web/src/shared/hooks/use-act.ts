import { useCallback, useState } from 'react';
import { asApiProblem, type ApiProblem } from '../api/api-problem';

/** An act on the server: whether it is under way, and what it was refused with. `run` tells whether it was done. */
export function useAct() {
  const [working, setWorking] = useState(false);
  const [problem, setProblem] = useState<ApiProblem | null>(null);
  const run = useCallback(async (act: () => Promise<unknown>): Promise<boolean> => {
    setWorking(true);
    setProblem(null);
    try {
      await act();
      return true;
    } catch (thrown) {
      setProblem(asApiProblem(thrown));
      return false;
    } finally {
      setWorking(false);
    }
  }, []);
  const forget = useCallback(() => setProblem(null), []);
  return { working, problem, run, forget };
}

export type Act = ReturnType<typeof useAct>;

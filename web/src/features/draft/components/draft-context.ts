import { createContext, use, type Dispatch } from 'react';
import type { Geometry, ListedPropertyEquation } from '../../../shared/api/types';
import type { LiveDraft } from '../hooks/use-draft-verdict';
import type { DraftChange } from '../model/change-draft';
import type { FormProblem } from '../model/form-reading';

/** What every part of the form needs at hand. */
export interface DraftTools {
  change: Dispatch<DraftChange>;
  /** What is wrong at a place of the definition. */
  problemAt: (path: string) => FormProblem | undefined;
  live: LiveDraft;
  geometries: readonly Geometry[];
  equations: readonly ListedPropertyEquation[];
}

export const DraftContext = createContext<DraftTools | null>(null);

export function useDraftTools(): DraftTools {
  const tools = use(DraftContext);
  if (tools === null) throw new Error('This part of the form stands outside a draft.');
  return tools;
}

import type { CslItem } from '@merestone/engine';
import type { components } from '@merestone/api-client';
import { api, ask } from '../../../shared/api/client';

type Answer = components['schemas']['ReadingResponse'];

/** References read from pasted text, with what is to be looked at and which sheets cite them already. */
export interface CitationReading extends Omit<Answer, 'items'> {
  items: CslItem[];
}

/** Has the server read BibTeX, RIS or CSL-JSON. */
export async function readCitations(text: string): Promise<CitationReading> {
  const answer = await ask(api.POST('/api/citations/reading', { body: { text } }));
  return { ...answer, items: answer.items as CslItem[] };
}

import type { Letter } from '../../../shared/api/types';

/** What became of a letter, as a phrase. */
export function letterState({ state, tries }: Pick<Letter, 'state' | 'tries'>): string {
  const tried = `${tries} ${tries === 1 ? 'try' : 'tries'}`;
  switch (state) {
    case 'local':
      return 'kept here';
    case 'waiting':
      return tries === 0 ? 'about to be sent' : `waiting after ${tried}`;
    case 'sent':
      return 'sent';
    case 'failed':
      return `given up after ${tried}`;
  }
}

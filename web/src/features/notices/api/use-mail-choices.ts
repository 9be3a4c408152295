import useSWR from 'swr';
import type { ApiProblem } from '../../../shared/api/api-problem';
import { api, ask } from '../../../shared/api/client';
import type { MailChoices } from '../../../shared/api/types';

const PREFERENCES = '/api/notices/preferences';

/** Which kinds of notices come by mail, too. */
export function useMailChoices() {
  const { data, error, mutate } = useSWR<{ mail: MailChoices }, ApiProblem>(PREFERENCES, () =>
    ask(api.GET(PREFERENCES)),
  );
  const choose = async (mail: MailChoices) => {
    await mutate(await ask(api.PUT(PREFERENCES, { body: { mail } })), { revalidate: false });
  };
  return { choices: data?.mail, problem: error, retry: () => void mutate(), choose };
}

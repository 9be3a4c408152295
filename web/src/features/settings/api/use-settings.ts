import useSWR from 'swr';
import type { ApiProblem } from '../../../shared/api/api-problem';
import { api, ask } from '../../../shared/api/client';
import type { Settings, SettingsChange } from '../../../shared/api/types';

const SETTINGS = '/api/settings';

/** What the office has decided on. */
export function useSettings() {
  const { data, error, mutate } = useSWR<Settings, ApiProblem>(SETTINGS, () => ask(api.GET(SETTINGS)));
  const change = async (settings: SettingsChange) => {
    await mutate(await ask(api.PUT(SETTINGS, { body: settings })), { revalidate: false });
  };
  return { settings: data, problem: error, retry: () => void mutate(), change };
}

import { ConfigProvider } from 'antd';
import type { ReactNode } from 'react';
import { mutate, SWRConfig } from 'swr';
import { asApiProblem } from '../shared/api/api-problem';
import { SESSION } from '../shared/session/use-session';
import { antdTheme } from '../theme/antd-theme';
import { useNightSheet } from '../theme/use-night-sheet';

/** What every page stands on: theme, messages and the data cache. */
export function Providers({ children }: { children: ReactNode }) {
  const night = useNightSheet();
  return (
    <ConfigProvider theme={antdTheme(night)} wave={{ disabled: true }}>
      <SWRConfig value={{ shouldRetryOnError: mayPass, revalidateOnFocus: false, onError: askWhoIsSignedIn }}>
        {children}
      </SWRConfig>
    </ConfigProvider>
  );
}

/** Only a lost connection or a failing server is worth asking again by itself. */
function mayPass(thrown: unknown): boolean {
  const { status } = asApiProblem(thrown);
  return status === 0 || status >= 500;
}

/** A session that was ended elsewhere is noticed at the next answer; the sign-in page then takes over. */
function askWhoIsSignedIn(thrown: unknown): void {
  if (asApiProblem(thrown).status === 401) void mutate(SESSION);
}

import CssBaseline from '@mui/material/CssBaseline';
import { ThemeProvider } from '@mui/material/styles';
import type { ReactNode } from 'react';
import { SWRConfig, mutate } from 'swr';
import { ME_KEY } from '../api/hooks/useMe';
import { asProblem } from '../api/problem';
import { NoticeProvider } from '../components/Notices';
import { theme } from '../theme/theme';

/** A 401 in the middle of work means the session ended: ask again who is signed in, and the shell reacts. */
function onError(error: unknown, key: string): void {
  if (key !== ME_KEY && asProblem(error).signedOut) void mutate(ME_KEY);
}

export function Providers({ children }: { children: ReactNode }) {
  return (
    <ThemeProvider
      theme={theme}
      defaultMode="system"
      modeStorageKey="stageyard-scheme"
      disableTransitionOnChange
      noSsr
    >
      <CssBaseline />
      <SWRConfig value={{ onError, shouldRetryOnError: false, dedupingInterval: 1000 }}>
        <NoticeProvider>{children}</NoticeProvider>
      </SWRConfig>
    </ThemeProvider>
  );
}

import CssBaseline from '@mui/material/CssBaseline';
import { ThemeProvider } from '@mui/material/styles';
import type { ReactNode } from 'react';
import { SWRConfig, mutate } from 'swr';
import { api } from '../api/client';
import { ME_KEY } from '../api/hooks/useMe';
import { NoticeProvider } from '../components/Notices';
import { theme } from '../theme/theme';

// A 401 in the middle of work, whether reading or saving, means the session ended: ask again who is signed in, and the
// shell reacts. The paths under /auth answer for themselves.
api.use({
  onResponse({ request, response }) {
    const { pathname } = new URL(request.url);
    if (response.status === 401 && !pathname.startsWith('/api/auth/')) void mutate(ME_KEY);
  },
});

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
      <SWRConfig value={{ shouldRetryOnError: false, dedupingInterval: 1000 }}>
        <NoticeProvider>{children}</NoticeProvider>
      </SWRConfig>
    </ThemeProvider>
  );
}

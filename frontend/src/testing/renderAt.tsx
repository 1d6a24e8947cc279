import { ThemeProvider } from '@mui/material/styles';
import { render } from '@testing-library/react';
import type { ReactElement } from 'react';
import { createMemoryRouter, RouterProvider, useLocation } from 'react-router-dom';
import { SWRConfig } from 'swr';
import { NoticeProvider } from '../components/Notices';
import { theme } from '../theme/theme';

function Address() {
  const { pathname, search } = useLocation();
  return <output data-testid="address">{pathname + search}</output>;
}

/** Renders a page at an address, with a cache of its own; the address is shown in `address`. */
export function renderAt(address: string, pattern: string, element: ReactElement) {
  const page = (
    <>
      {element}
      <Address />
    </>
  );
  const router = createMemoryRouter(
    [
      { path: pattern, element: page },
      { path: '*', element: <Address /> },
    ],
    { initialEntries: [address] },
  );
  render(
    <ThemeProvider theme={theme}>
      <SWRConfig value={{ provider: () => new Map(), dedupingInterval: 0, shouldRetryOnError: false }}>
        <NoticeProvider>
          <RouterProvider router={router} />
        </NoticeProvider>
      </SWRConfig>
    </ThemeProvider>,
  );
  return { router };
}

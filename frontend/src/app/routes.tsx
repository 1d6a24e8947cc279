import type { ComponentType } from 'react';
import { createBrowserRouter, type RouteObject } from 'react-router-dom';
import { NotFoundPage } from './NotFoundPage';
import { PageLoading } from './PageLoading';
import { RouteError } from './RouteError';

type PageModule = { default: ComponentType };

/** One lazily loaded page with its own error boundary, so that a broken page leaves the shell standing. */
function page(path: string | undefined, load: () => Promise<PageModule>): RouteObject {
  const lazy = async () => ({ Component: (await load()).default });
  const route = { lazy, errorElement: <RouteError />, hydrateFallbackElement: <PageLoading /> };
  return path === undefined ? { index: true, ...route } : { path, ...route };
}

export const router = createBrowserRouter([
  {
    errorElement: <RouteError />,
    hydrateFallbackElement: <PageLoading />,
    children: [
      page('/sign-in', () => import('../features/sign-in/SignInPage')),
      page('/accept-invite', () => import('../features/sign-in/AcceptInvitePage')),
      {
        path: '/',
        // Lazy, so that the sign-in page does not carry the shell's search and menus.
        lazy: async () => ({ Component: (await import('./SignedInShell')).SignedInShell }),
        hydrateFallbackElement: <PageLoading />,
        children: [
          page(undefined, () => import('../features/home/HomePage')),
          page('parts', () => import('../features/parts/PartsPage')),
          // Not under /parts, where every word may be a part's number.
          page('add-part', () => import('../features/parts/AddPartPage')),
          page('parts/:number', () => import('../features/parts/PartPage')),
          page('briefs', () => import('../features/briefs/BriefsPage')),
          page('briefs/:id', () => import('../features/briefs/BriefPage')),
          page('briefs/:id/compare', () => import('../features/compare/ComparePage')),
          page('trains', () => import('../features/trains/TrainsPage')),
          page('trains/:code', () => import('../features/trains/TrainPage')),
          page('suppliers', () => import('../features/suppliers/SuppliersPage')),
          page('suppliers/:code', () => import('../features/suppliers/SupplierPage')),
          page('add-supplier', () => import('../features/suppliers/AddSupplierPage')),
          page('offers', () => import('../features/offers/OffersPage')),
          page('offers/:id', () => import('../features/offers/OfferPage')),
          page('add-offer', () => import('../features/offers/AddOfferPage')),
          page('stock', () => import('../features/stock/StockPage')),
          page('stock/count', () => import('../features/stock/CountPage')),
          page('people', () => import('../features/people/PeoplePage')),
          { path: '*', element: <NotFoundPage /> },
        ],
      },
    ],
  },
]);

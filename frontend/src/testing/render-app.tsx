import { render, type RenderResult } from '@testing-library/react';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';

import { Providers } from '../app/providers';
import { createQueryClient } from '../app/query-client';
import { routes } from '../app/router';
import { signedOutStore } from '../app/signed-out-store';

export interface RenderedApp extends RenderResult {
  /** Where the program is: path and query. */
  readonly address: () => string;
}

/** The whole program at an address, as main.tsx mounts it; only failed requests are not repeated. */
export function renderApp(address: string): RenderedApp {
  signedOutStore.set(false);
  const queryClient = createQueryClient(() => signedOutStore.set(true));
  queryClient.setDefaultOptions({ queries: { retry: false, gcTime: 0 } });
  const router = createMemoryRouter(routes, { initialEntries: [address] });
  const rendered = render(
    <Providers queryClient={queryClient}>
      <RouterProvider router={router} />
    </Providers>,
  );
  return { ...rendered, address: () => `${router.state.location.pathname}${router.state.location.search}` };
}

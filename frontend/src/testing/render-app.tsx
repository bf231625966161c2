import { QueryClient } from '@tanstack/react-query';
import { render, type RenderResult } from '@testing-library/react';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';

import { Providers } from '../app/providers';
import { routes } from '../app/router';

export interface RenderedApp extends RenderResult {
  /** Where the program is: path and query. */
  readonly address: () => string;
}

/** The whole program at an address, as main.tsx mounts it; only failed requests are not repeated. */
export function renderApp(address: string): RenderedApp {
  const queryClient = new QueryClient({ defaultOptions: { queries: { retry: false, gcTime: 0 } } });
  const router = createMemoryRouter(routes, { initialEntries: [address] });
  const rendered = render(
    <Providers queryClient={queryClient}>
      <RouterProvider router={router} />
    </Providers>,
  );
  return { ...rendered, address: () => `${router.state.location.pathname}${router.state.location.search}` };
}

import '@fontsource/source-sans-3/400.css';
import '@fontsource/source-sans-3/600.css';
import 'antd/dist/reset.css';
import './app/theme/tokens.css';
import './app/theme/base.css';

import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { createBrowserRouter, RouterProvider } from 'react-router-dom';

import { Providers } from './app/providers';
import { createQueryClient } from './app/query-client';
import { routes } from './app/router';
import { signedOutStore } from './app/signed-out-store';

const root = document.getElementById('root');
if (!root) throw new Error('index.html has no #root');

createRoot(root).render(
  <StrictMode>
    <Providers queryClient={createQueryClient(() => signedOutStore.set(true))}>
      <RouterProvider router={createBrowserRouter(routes)} />
    </Providers>
  </StrictMode>,
);

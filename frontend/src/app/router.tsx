import type { ComponentType } from 'react';
import type { RouteObject } from 'react-router-dom';

import { AppLayout } from './layout/app-layout';
import { PageSkeleton } from './layout/page-skeleton';
import { RouteError } from './layout/route-error';

type RouteModule = Promise<{ readonly Component: ComponentType }>;

/** Every page is a file in routes/ that exports `Component`, loaded when it is first opened. */
const page = (path: string, load: () => RouteModule): RouteObject => ({
  path,
  lazy: load,
  errorElement: <RouteError />,
  HydrateFallback: PageSkeleton,
});

export const routes: RouteObject[] = [
  page('/sign-in', () => import('./routes/sign-in')),
  page('/setup', () => import('./routes/setup')),
  page('/welcome/:token', () => import('./routes/welcome')),
  {
    element: <AppLayout />,
    errorElement: <RouteError />,
    HydrateFallback: PageSkeleton,
    children: [
      page('/', () => import('./routes/desk')),
      page('/projects', () => import('./routes/projects')),
      page('/projects/new', () => import('./routes/new-project')),
      page('/projects/:projectId', () => import('./routes/project')),
      page('/projects/:projectId/settings', () => import('./routes/project-settings')),
      page('/projects/:projectId/chains/new', () => import('./routes/new-chain')),
      page('/projects/:projectId/chains/:chainId/*', () => import('./routes/chain-workspace')),
      page('/devices', () => import('./routes/devices')),
      page('/devices/new', () => import('./routes/new-device')),
      page('/devices/:deviceId', () => import('./routes/device')),
      page('/devices/:deviceId/edit', () => import('./routes/edit-device')),
      page('/administration', () => import('./routes/administration')),
      page('/about', () => import('./routes/about')),
      page('*', () => import('./routes/not-found')),
    ],
  },
];

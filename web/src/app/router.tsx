import { createBrowserRouter } from 'react-router-dom';
import { ErrorPage } from './error-page.tsx';
import { Layout } from './layout.tsx';

/** Pages are loaded when they are opened. */
export const router = createBrowserRouter([
  { path: '/sign-in', lazy: () => import('./routes/sign-in.tsx'), ErrorBoundary: ErrorPage, HydrateFallback: () => null },
  {
    path: '/',
    Component: Layout,
    ErrorBoundary: ErrorPage,
    HydrateFallback: () => null,
    children: [
      {
        ErrorBoundary: ErrorPage,
        children: [
          { index: true, lazy: () => import('./routes/overview.tsx') },
          { path: 'workbench', lazy: () => import('./routes/workbench.tsx') },
          { path: 'conventions', lazy: () => import('./routes/conventions.tsx') },
          { path: 'conventions/:id', lazy: () => import('./routes/convention.tsx') },
          { path: 'verify', lazy: () => import('./routes/verify.tsx') },
          { path: 'identify', lazy: () => import('./routes/identify.tsx') },
          { path: 'runs', lazy: () => import('./routes/runs.tsx') },
          { path: 'runs/:id', lazy: () => import('./routes/run.tsx') },
          { path: 'keys', lazy: () => import('./routes/keys.tsx') },
          { path: 'history', lazy: () => import('./routes/history.tsx') },
          { path: 'usage', lazy: () => import('./routes/usage.tsx') },
          { path: 'first-call', lazy: () => import('./routes/first-call.tsx') },
          { path: 'problems/:code', lazy: () => import('./routes/problem.tsx') },
          { path: '*', lazy: () => import('./routes/not-found.tsx') },
        ],
      },
    ],
  },
]);

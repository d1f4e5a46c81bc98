import type { QueryClient } from '@tanstack/react-query';
import type { ComponentType } from 'react';
import { redirect, type LoaderFunction, type LoaderFunctionArgs, type RouteObject } from 'react-router-dom';
import { pageWanted } from '../lib/page-wanted';
import { session } from '../lib/session';
import { PageLoading } from './shell/page-loading';
import { NowherePage, RouteError } from './shell/route-error';
import { Shell } from './shell/shell';

/** What a file of routes/ exports. */
interface RouteFile {
  readonly Component: ComponentType;
  readonly loader?: (queryClient: QueryClient) => LoaderFunction;
  readonly handle?: unknown;
}
interface Page {
  readonly path: string;
  readonly file: () => Promise<RouteFile>;
  /** `members` asks for a sign-in; `guests` sends whoever has one to their bench. */
  readonly for: 'everybody' | 'guests' | 'members';
}

const PAGES: readonly Page[] = [
  { path: '/', for: 'guests', file: () => import('../routes/landing') },
  { path: '/sign-in', for: 'guests', file: () => import('../routes/sign-in') },
  { path: '/sign-up', for: 'guests', file: () => import('../routes/sign-up') },
  { path: '/confirm-email', for: 'everybody', file: () => import('../routes/confirm-email') },
  { path: '/forgotten', for: 'everybody', file: () => import('../routes/forgotten') },
  { path: '/reset-password', for: 'everybody', file: () => import('../routes/reset-password') },
  { path: '/stop', for: 'everybody', file: () => import('../routes/stop') },
  { path: '/account', for: 'members', file: () => import('../routes/account') },
  { path: '/bench', for: 'members', file: () => import('../routes/bench') },
  { path: '/ask', for: 'members', file: () => import('../routes/ask') },
  { path: '/kit', for: 'members', file: () => import('../routes/kit') },
  { path: '/kit/:kitId', for: 'members', file: () => import('../routes/kit') },
  { path: '/sections/:sectionId', for: 'members', file: () => import('../routes/section') },
  { path: '/questions', for: 'members', file: () => import('../routes/questions') },
  { path: '/questions/:questionId', for: 'members', file: () => import('../routes/question') },
  { path: '/desk', for: 'members', file: () => import('../routes/desk') },
  { path: '/record', for: 'members', file: () => import('../routes/record') },
  { path: '/search', for: 'members', file: () => import('../routes/search') },
];

/** Where whoever has to sign in first wanted to go. */
function wantedOf(request: Request): string {
  const { pathname, search } = new URL(request.url);
  return pathname + search;
}

async function admit(page: Page, request: Request): Promise<void> {
  if (page.for === 'everybody') {
    // They read what they came for, signed in or not, with a network or without.
    void session.start().catch(() => undefined);
    return;
  }
  await session.start();
  const isSignedIn = session.me() !== null;
  const { searchParams } = new URL(request.url);
  if (page.for === 'guests' && isSignedIn) throw redirect(pageWanted(searchParams.get('next')));
  if (page.for === 'members' && !isSignedIn)
    throw redirect(`/sign-in?next=${encodeURIComponent(wantedOf(request))}`);
}

function routeOf(page: Page, queryClient: QueryClient): RouteObject {
  return {
    path: page.path,
    HydrateFallback: PageLoading,
    ErrorBoundary: RouteError,
    lazy: async () => {
      const file = await page.file();
      const load = file.loader?.(queryClient);
      return {
        Component: file.Component,
        handle: file.handle,
        loader: async (args: LoaderFunctionArgs) => {
          await admit(page, args.request);
          return (await load?.(args)) ?? null;
        },
      };
    },
  };
}

export function createRoutes(queryClient: QueryClient): RouteObject[] {
  return [
    {
      Component: Shell,
      HydrateFallback: PageLoading,
      ErrorBoundary: RouteError,
      children: [...PAGES.map((page) => routeOf(page, queryClient)), { path: '*', Component: NowherePage }],
    },
  ];
}

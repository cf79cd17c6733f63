import type { QueryClient } from '@tanstack/react-query';
import type { ComponentType } from 'react';
import { matchRoutes, Navigate, type Params, type RouteObject } from 'react-router-dom';
import { accessQuery } from '../features/access/api/access';
import { designSetQuery, limitsQuery } from '../features/designs/api/design-set';
import { profileQuery } from '../features/profile/api/profile';
import { costsQuery, ledgerQuery, studiesQuery, studyQuery } from '../features/studies/api/studies';
import { lazily } from '../shared/ui/lazily';
import { AppFrame } from './layout/app-frame';
import { StudyFrame } from './layout/study-frame';
import { paths } from './paths';
import { SignedIn } from './signed-in';

/** What a route sends for as soon as the address is known, and does not wait for. */
interface Preparation {
  script?: () => void;
  queries?: (queryClient: QueryClient, params: Params) => void;
}

type PagesQueries = NonNullable<Preparation['queries']>;

/** A page in a script of its own. */
function page(load: () => Promise<ComponentType<object>>, queries?: PagesQueries) {
  const Page = lazily(load);
  return { element: <Page />, handle: { script: Page.sendFor, queries } };
}

const access: PagesQueries = (queryClient) => void queryClient.prefetchQuery(accessQuery());
const studies: PagesQueries = (queryClient) => void queryClient.prefetchQuery(studiesQuery());
const profile: PagesQueries = (queryClient) => void queryClient.prefetchQuery(profileQuery());
const limits: PagesQueries = (queryClient, { studyId = '' }) =>
  void queryClient.prefetchQuery(limitsQuery(studyId));
const study: PagesQueries = (queryClient, { studyId = '' }) => {
  void queryClient.prefetchQuery(studyQuery(studyId));
  void queryClient.prefetchQuery(ledgerQuery(studyId));
  void queryClient.prefetchQuery(costsQuery(studyId));
  void queryClient.prefetchQuery(designSetQuery(studyId));
};

export const routes: RouteObject[] = [
  {
    path: paths.signIn,
    ...page(async () => (await import('./routes/sign-in-page')).SignInPage, access),
  },
  {
    path: '/welcome/:code',
    ...page(async () => (await import('./routes/welcome-page')).WelcomePage, access),
  },
  {
    path: paths.studies,
    element: (
      <SignedIn>
        <AppFrame />
      </SignedIn>
    ),
    children: [
      { index: true, ...page(async () => (await import('./routes/studies-page')).StudiesPage, studies) },
      { path: 'studies/new', ...page(async () => (await import('./routes/new-study-page')).NewStudyPage) },
      {
        path: 'studies/:studyId',
        element: <StudyFrame />,
        handle: { queries: study },
        children: [
          { index: true, element: <Navigate to="weigh" replace /> },
          { path: 'question', ...page(async () => (await import('./routes/question-page')).QuestionPage) },
          { path: 'ledger', ...page(async () => (await import('./routes/ledger-page')).LedgerPage) },
          { path: 'costs', ...page(async () => (await import('./routes/costs-page')).CostsPage) },
          { path: 'weigh', ...page(async () => (await import('./routes/weigh-page')).WeighPage, limits) },
          { path: 'members', ...page(async () => (await import('./routes/members-page')).MembersPage) },
          { path: 'history', ...page(async () => (await import('./routes/history-page')).HistoryPage) },
          {
            path: 'options/:optionId',
            ...page(async () => (await import('./routes/working-page')).WorkingPage, limits),
          },
        ],
      },
      {
        path: paths.profile,
        ...page(async () => (await import('./routes/profile-page')).ProfilePage, profile),
      },
      { path: paths.admin, ...page(async () => (await import('./routes/admin-page')).AdminPage) },
      { path: '*', ...page(async () => (await import('./routes/not-found-page')).NotFoundPage) },
    ],
  },
];

/** Sends for all that the page at an address is made of at once: its script, and what it asks of the server. */
export function prepare(queryClient: QueryClient, pathname: string): void {
  for (const { route, params } of matchRoutes(routes, pathname) ?? []) {
    const { script, queries }: Preparation = route.handle ?? {};
    script?.();
    queries?.(queryClient, params);
  }
}

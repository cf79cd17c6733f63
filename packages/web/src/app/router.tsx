import type { QueryClient } from '@tanstack/react-query';
import { type LoaderFunctionArgs, type RouteObject, redirect } from 'react-router-dom';
import { accessQuery, sessionQuery } from '../features/access/api/access';
import { designSetQuery } from '../features/designs/api/design-set';
import { profileQuery } from '../features/profile/api/profile';
import { costsQuery, ledgerQuery, studiesQuery, studyQuery } from '../features/studies/api/studies';
import { paths, signInPath } from './paths';
import { ErrorPage } from './routes/error-page';

/** Every page, each in a script of its own; loaders set the queries off and do not wait for them. */
export function createRoutes(queryClient: QueryClient): RouteObject[] {
  const signedIn = async ({ request }: LoaderFunctionArgs) => {
    const person = await queryClient.ensureQueryData(sessionQuery());
    if (!person) throw redirect(signInPath(new URL(request.url)));
    return null;
  };
  const access = () => {
    void queryClient.prefetchQuery(accessQuery());
    return null;
  };
  const studies = () => {
    void queryClient.prefetchQuery(studiesQuery());
    return null;
  };
  const profile = () => {
    void queryClient.prefetchQuery(profileQuery());
    return null;
  };
  const study = ({ params: { studyId = '' } }: LoaderFunctionArgs) => {
    void queryClient.prefetchQuery(studyQuery(studyId));
    void queryClient.prefetchQuery(ledgerQuery(studyId));
    void queryClient.prefetchQuery(costsQuery(studyId));
    void queryClient.prefetchQuery(designSetQuery(studyId));
    return null;
  };

  return [
    {
      ErrorBoundary: ErrorPage,
      HydrateFallback: () => null,
      children: [
        {
          path: paths.signIn,
          loader: access,
          lazy: { Component: async () => (await import('./routes/sign-in-page')).SignInPage },
        },
        {
          path: '/welcome/:code',
          loader: access,
          lazy: { Component: async () => (await import('./routes/welcome-page')).WelcomePage },
        },
        {
          path: paths.studies,
          loader: signedIn,
          lazy: { Component: async () => (await import('./layout/app-frame')).AppFrame },
          children: [
            {
              index: true,
              loader: studies,
              lazy: { Component: async () => (await import('./routes/studies-page')).StudiesPage },
            },
            {
              path: 'studies/new',
              lazy: { Component: async () => (await import('./routes/new-study-page')).NewStudyPage },
            },
            {
              path: 'studies/:studyId',
              loader: study,
              lazy: { Component: async () => (await import('./layout/study-frame')).StudyFrame },
              children: [
                { index: true, loader: ({ params }) => redirect(paths.weigh(params.studyId as string)) },
                {
                  path: 'question',
                  lazy: { Component: async () => (await import('./routes/question-page')).QuestionPage },
                },
                {
                  path: 'ledger',
                  lazy: { Component: async () => (await import('./routes/ledger-page')).LedgerPage },
                },
                {
                  path: 'costs',
                  lazy: { Component: async () => (await import('./routes/costs-page')).CostsPage },
                },
                {
                  path: 'weigh',
                  lazy: { Component: async () => (await import('./routes/weigh-page')).WeighPage },
                },
                {
                  path: 'members',
                  lazy: { Component: async () => (await import('./routes/members-page')).MembersPage },
                },
                {
                  path: 'history',
                  lazy: { Component: async () => (await import('./routes/history-page')).HistoryPage },
                },
                {
                  path: 'options/:optionId',
                  lazy: { Component: async () => (await import('./routes/working-page')).WorkingPage },
                },
              ],
            },
            {
              path: paths.profile,
              loader: profile,
              lazy: { Component: async () => (await import('./routes/profile-page')).ProfilePage },
            },
            {
              path: paths.admin,
              lazy: { Component: async () => (await import('./routes/admin-page')).AdminPage },
            },
            {
              path: '*',
              lazy: { Component: async () => (await import('./routes/not-found-page')).NotFoundPage },
            },
          ],
        },
      ],
    },
  ];
}

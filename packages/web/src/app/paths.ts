export const paths = {
  studies: '/',
  signIn: '/sign-in',
  welcome: (code: string) => `/welcome/${encodeURIComponent(code)}`,
  question: (studyId: string) => `/studies/${studyId}/question`,
  ledger: (studyId: string) => `/studies/${studyId}/ledger`,
  costs: (studyId: string) => `/studies/${studyId}/costs`,
  newStudy: '/studies/new',
  weigh: (studyId: string, optionId?: string) =>
    `/studies/${studyId}/weigh${optionId ? `?option=${optionId}` : ''}`,
  members: (studyId: string) => `/studies/${studyId}/members`,
  history: (studyId: string) => `/studies/${studyId}/history`,
  profile: '/profile',
  admin: '/admin',
  /** With the person's edits, unless what is stored is asked for. */
  working: (studyId: string, optionId: string, version?: 'stored') =>
    `/studies/${studyId}/options/${optionId}${version ? `?version=${version}` : ''}`,
};

/** Signing in, and back to where one came from. */
export function signInPath({ pathname, search }: { pathname: string; search: string }): string {
  const from = `${pathname}${search}`;
  return from === paths.studies ? paths.signIn : `${paths.signIn}?${new URLSearchParams({ from })}`;
}

/** The page to return to after signing in: one of ours, or the studies. */
export function returnPath(from: string | null): string {
  if (from === null) return paths.studies;
  const url = new URL(from, location.origin);
  const ours = url.origin === location.origin && url.pathname !== paths.signIn;
  return ours ? `${url.pathname}${url.search}` : paths.studies;
}

import type { PersonView } from '@steelyard/api/contract/access';
import { useQueryClient, useSuspenseQuery } from '@tanstack/react-query';
import { useLocation, useNavigate, useSearchParams } from 'react-router-dom';
import { accessQuery, sessionQuery } from '../../features/access/api/access';
import { ConsoleCode } from '../../features/access/components/console-code';
import { DemoStrip } from '../../features/access/components/demo-strip';
import { SignInForm } from '../../features/access/components/sign-in-form';
import { QueryBoundary } from '../../shared/ui/query-boundary';
import { DoorColumns, DoorFrame, DoorSkeleton } from '../layout/door-frame';
import { paths, returnPath } from '../paths';

export function SignInPage() {
  const { state } = useLocation() as { state: { expired?: boolean } | null };
  return (
    <DoorFrame
      heading="Sign in"
      notice={state?.expired ? 'Your session has ended. Sign in to go on where you were.' : undefined}
    >
      <title>Sign in · Steelyard</title>
      <QueryBoundary what="sign-in page" skeleton={<DoorSkeleton />}>
        <Door />
      </QueryBoundary>
    </DoorFrame>
  );
}

function Door() {
  const queryClient = useQueryClient();
  const navigate = useNavigate();
  const [search] = useSearchParams();
  const { data: access } = useSuspenseQuery(accessQuery());

  if (access.firstVisit) {
    return (
      <DoorColumns>
        <ConsoleCode onCode={(code) => void navigate(paths.welcome(code))} />
      </DoorColumns>
    );
  }

  const enter = (person: PersonView) => {
    queryClient.clear();
    queryClient.setQueryData(sessionQuery().queryKey, person);
    void navigate(returnPath(search.get('from')), { replace: true });
  };
  return (
    <DoorColumns>
      <SignInForm onSignedIn={enter} />
      {access.demo && <DemoStrip {...access.demo} onSignedIn={enter} />}
    </DoorColumns>
  );
}

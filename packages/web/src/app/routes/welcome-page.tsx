import { useQueryClient, useSuspenseQuery } from '@tanstack/react-query';
import { useNavigate, useParams } from 'react-router-dom';
import { accessQuery, sessionQuery } from '../../features/access/api/access';
import { AdministratorForm } from '../../features/access/components/administrator-form';
import { QueryBoundary } from '../../shared/ui/query-boundary';
import { TextLink } from '../../shared/ui/text-link';
import { DoorColumns, DoorFrame, DoorSkeleton } from '../layout/door-frame';
import { paths } from '../paths';

export function WelcomePage() {
  return (
    <DoorFrame heading="Welcome">
      <title>Welcome · Steelyard</title>
      <QueryBoundary what="welcome page" skeleton={<DoorSkeleton />}>
        <FirstVisit />
      </QueryBoundary>
    </DoorFrame>
  );
}

function FirstVisit() {
  const queryClient = useQueryClient();
  const navigate = useNavigate();
  const { code = '' } = useParams();
  const { data: access } = useSuspenseQuery(accessQuery());

  if (!access.firstVisit) {
    return (
      <p>
        This installation has its first administrator already, so the link has served its purpose.{' '}
        <TextLink to={paths.signIn}>Sign in</TextLink>
      </p>
    );
  }
  return (
    <DoorColumns>
      <AdministratorForm
        code={code}
        onCreated={(person) => {
          queryClient.clear();
          queryClient.setQueryData(sessionQuery().queryKey, person);
          void navigate(paths.studies, { replace: true });
        }}
      />
    </DoorColumns>
  );
}

import type { PersonView } from '@steelyard/api/contract/access';
import { useQueryClient, useSuspenseQuery } from '@tanstack/react-query';
import { useNavigate, useParams } from 'react-router-dom';
import { accessQuery, sessionQuery } from '../../features/access/api/access';
import { welcomeQuery } from '../../features/access/api/welcome';
import { AdministratorForm } from '../../features/access/components/administrator-form';
import { WelcomeForm } from '../../features/access/components/welcome-form';
import { QueryBoundary } from '../../shared/ui/query-boundary';
import { TextLink } from '../../shared/ui/text-link';
import { DoorColumns, DoorFrame, DoorSkeleton } from '../layout/door-frame';
import { paths } from '../paths';

export function WelcomePage() {
  return (
    <DoorFrame heading="Welcome">
      <title>Welcome · Steelyard</title>
      <QueryBoundary what="welcome page" skeleton={<DoorSkeleton />}>
        <Welcome />
      </QueryBoundary>
    </DoorFrame>
  );
}

interface EntranceProps {
  code: string;
  onEntered: (person: PersonView) => void;
}

/** The first visitor comes with the console’s code; once somebody has an account, codes are invitations. */
function Welcome() {
  const queryClient = useQueryClient();
  const navigate = useNavigate();
  const { code = '' } = useParams();
  const { data: access } = useSuspenseQuery(accessQuery());

  const enter = (person: PersonView) => {
    queryClient.clear();
    queryClient.setQueryData(sessionQuery().queryKey, person);
    void navigate(paths.studies, { replace: true });
  };
  return access.firstVisit ? (
    <DoorColumns>
      <AdministratorForm code={code} onCreated={enter} />
    </DoorColumns>
  ) : (
    <Invitation code={code} onEntered={enter} />
  );
}

function Invitation({ code, onEntered }: EntranceProps) {
  const { data: invited } = useSuspenseQuery(welcomeQuery(code));
  if (!invited) {
    return (
      <div>
        <p>This link lets nobody in any more: it was used, it is too old, or a newer one was made.</p>
        <p>
          <TextLink to={paths.signIn}>Sign in</TextLink>, or ask an administrator for a new link.
        </p>
      </div>
    );
  }
  return (
    <DoorColumns>
      <WelcomeForm token={code} invited={invited} onEntered={onEntered} />
    </DoorColumns>
  );
}

import { makeStyles } from '@fluentui/react-components';
import { useQueryClient, useSuspenseQuery } from '@tanstack/react-query';
import { accessQuery } from '../../features/access/api/access';
import { profileQuery } from '../../features/profile/api/profile';
import { NameForm } from '../../features/profile/components/name-form';
import { PasswordForm } from '../../features/profile/components/password-form';
import { SignOutEverywhere } from '../../features/profile/components/sign-out-everywhere';
import { MainRegion } from '../../shared/ui/main-region';
import { PageBody } from '../../shared/ui/page-body';
import { QueryBoundary } from '../../shared/ui/query-boundary';
import { TitledSection } from '../../shared/ui/titled-section';
import { DoorSkeleton } from '../layout/door-frame';
import { paths } from '../paths';
import { useDeparture } from '../use-departure';

const useStyles = makeStyles({ sections: { display: 'grid', gap: '28px', maxWidth: '440px' } });

export function ProfilePage() {
  return (
    <MainRegion>
      <title>Profile · Steelyard</title>
      <QueryBoundary what="profile" wholePage skeleton={<DoorSkeleton />}>
        <Profile />
      </QueryBoundary>
    </MainRegion>
  );
}

function Profile() {
  const styles = useStyles();
  const queryClient = useQueryClient();
  const depart = useDeparture();
  const { data: profile } = useSuspenseQuery(profileQuery());
  const leave = () =>
    depart(paths.signIn, () =>
      queryClient.removeQueries({ predicate: ({ queryKey }) => queryKey[0] !== accessQuery().queryKey[0] }),
    );
  return (
    <PageBody heading="Profile" sub={`You sign in as ${profile.email}.`}>
      <div className={styles.sections}>
        <TitledSection title="Your name" level={2}>
          <NameForm />
        </TitledSection>
        <TitledSection title="Your password" level={2}>
          <PasswordForm email={profile.email} />
        </TitledSection>
        <TitledSection title="Your sessions" level={2}>
          <SignOutEverywhere onSignedOut={leave} />
        </TitledSection>
      </div>
    </PageBody>
  );
}

import { useSuspenseQuery } from '@tanstack/react-query';
import { sessionQuery } from '../../features/access/api/access';
import { siteHistoryQuery } from '../../features/history/api/history';
import { History } from '../../features/history/components/history';
import { HistorySkeleton } from '../../features/history/components/history-skeleton';
import { People } from '../../features/people/components/people';
import { PeopleSkeleton } from '../../features/people/components/people-skeleton';
import { MainRegion } from '../../shared/ui/main-region';
import { PageBody } from '../../shared/ui/page-body';
import { QueryBoundary } from '../../shared/ui/query-boundary';
import { TextLink } from '../../shared/ui/text-link';
import { TitledSection } from '../../shared/ui/titled-section';
import { paths } from '../paths';

export function AdminPage() {
  const { data: person } = useSuspenseQuery(sessionQuery());
  return (
    <MainRegion>
      <title>People · Steelyard</title>
      {person?.administrator ? <Administration /> : <NotAnAdministrator />}
    </MainRegion>
  );
}

function Administration() {
  return (
    <PageBody heading="People" sub="Who has an account here. A study’s content is open to its members alone.">
      <QueryBoundary what="list of people" skeleton={<PeopleSkeleton />}>
        <People />
      </QueryBoundary>
      <TitledSection title="What was done to people and their accounts" level={2}>
        <QueryBoundary what="record" skeleton={<HistorySkeleton />}>
          <History query={siteHistoryQuery()} label="Record" empty="Nothing has been done yet." />
        </QueryBoundary>
      </TitledSection>
    </PageBody>
  );
}

function NotAnAdministrator() {
  return (
    <PageBody heading="This page is for administrators" sub="They look after people and their accounts.">
      <p>
        <TextLink to={paths.studies}>Go to your studies</TextLink>
      </p>
    </PageBody>
  );
}

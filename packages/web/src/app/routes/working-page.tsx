import { useParams, useSearchParams } from 'react-router-dom';
import { useWeighing } from '../../features/weigh/api/use-weighing';
import { WeighSkeleton } from '../../features/weigh/components/weigh-skeleton';
import { Working } from '../../features/working/components/working';
import { WorkingVersion } from '../../features/working/components/working-version';
import { PageBody } from '../../shared/ui/page-body';
import { QueryBoundary } from '../../shared/ui/query-boundary';
import { TextLink } from '../../shared/ui/text-link';
import { paths } from '../paths';

export function WorkingPage() {
  const { studyId = '', optionId = '' } = useParams();
  return (
    <QueryBoundary key={studyId} what="study" wholePage skeleton={<WeighSkeleton />}>
      <WorkingOf studyId={studyId} optionId={optionId} />
    </QueryBoundary>
  );
}

function WorkingOf({ studyId, optionId }: { studyId: string; optionId: string }) {
  const [search] = useSearchParams();
  const version = search.get('version') === 'stored' ? 'stored' : 'edited';
  const weighing = useWeighing(studyId, version);
  const option = weighing.options.find(({ id }) => id === optionId);
  const { name } = weighing.study;
  if (!option) {
    return (
      <PageBody heading="There is no such option in this study" sub="It may have been removed.">
        <title>{`Option not found · ${name} · Steelyard`}</title>
        <p>
          <TextLink to={paths.weigh(studyId)}>Go back to the options</TextLink>
        </p>
      </PageBody>
    );
  }
  return (
    <>
      <title>{`Working of ${option.letter} · ${name} · Steelyard`}</title>
      <Working
        key={optionId}
        option={option}
        weighing={weighing}
        weighHref={paths.weigh(studyId, optionId)}
        version={
          <WorkingVersion
            edited={option.draft !== undefined || weighing.sizing !== undefined}
            storedHref={paths.working(studyId, optionId, 'stored')}
            editedHref={version === 'stored' ? paths.working(studyId, optionId) : undefined}
          />
        }
      />
    </>
  );
}

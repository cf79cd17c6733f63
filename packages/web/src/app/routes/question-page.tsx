import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { Question } from '../../features/question/components/question';
import { studyQuery } from '../../features/studies/api/studies';
import { FormSkeleton } from '../../shared/ui/form-skeleton';
import { PageBody } from '../../shared/ui/page-body';
import { QueryBoundary } from '../../shared/ui/query-boundary';

export function QuestionPage() {
  const { studyId = '' } = useParams();
  const { data: study } = useQuery(studyQuery(studyId));
  return (
    <PageBody
      heading="Question"
      sub="What the study asks, what exactly it estimates, and the difference it must be able to find."
    >
      <title>{`Question · ${study ? `${study.name} · ` : ''}Steelyard`}</title>
      <QueryBoundary key={studyId} what="question" skeleton={<FormSkeleton label="Loading the question" />}>
        <Question studyId={studyId} />
      </QueryBoundary>
    </PageBody>
  );
}

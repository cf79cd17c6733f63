import { useNavigate } from 'react-router-dom';
import { NewStudyForm } from '../../features/studies/components/new-study-form';
import { MainRegion } from '../../shared/ui/main-region';
import { PageBody } from '../../shared/ui/page-body';
import { paths } from '../paths';

export function NewStudyPage() {
  const navigate = useNavigate();
  return (
    <MainRegion>
      <title>New study · Steelyard</title>
      <PageBody
        heading="New study"
        sub="One page, a few minutes: what you ask here is enough to weigh a first option. You become its methodologist."
      >
        <NewStudyForm onStarted={({ id }) => void navigate(paths.weigh(id))} />
      </PageBody>
    </MainRegion>
  );
}

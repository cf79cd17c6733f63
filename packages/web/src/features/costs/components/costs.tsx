import { mayEdit } from '../../designs/model/rights';
import { useStored } from '../../studies/api/use-stored';
import { CostsFacts } from './costs-facts';
import { CostsForm } from './costs-form';
import { SharingRule } from './sharing-rule';

/** A study’s money and months: a form for those who may change them, figures for the others. */
export function Costs({ studyId }: { studyId: string }) {
  const stored = useStored(studyId);
  const { study, costs } = stored;
  return (
    <>
      <SharingRule study={study} />
      {mayEdit(study.role) ? <CostsForm stored={stored} /> : <CostsFacts study={study} costs={costs} />}
    </>
  );
}

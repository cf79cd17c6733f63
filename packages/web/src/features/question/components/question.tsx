import { mayEdit } from '../../designs/model/rights';
import { useStored } from '../../studies/api/use-stored';
import { QuestionFacts } from './question-facts';
import { QuestionForm } from './question-form';

/** A study’s question: a form for those who may change it, text for the others. */
export function Question({ studyId }: { studyId: string }) {
  const stored = useStored(studyId);
  return mayEdit(stored.study.role) ? (
    <QuestionForm stored={stored} />
  ) : (
    <QuestionFacts study={stored.study} />
  );
}

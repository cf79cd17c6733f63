import type { NewQuestion } from '@steelyard/api/contract/question';
import type { StudyView } from '@steelyard/api/contract/studies';
import type { QueryClient } from '@tanstack/react-query';
import { api } from '../../../shared/api/client';
import { studyQuery } from '../../studies/api/studies';

export const putQuestion = (studyId: string, body: NewQuestion) =>
  api.put<StudyView>(`/studies/${studyId}/question`, body);

/** Puts the study as the server now has it in place of what was shown. */
export function keepStudy(queryClient: QueryClient, study: StudyView): void {
  queryClient.setQueryData(studyQuery(study.id).queryKey, study);
  void queryClient.invalidateQueries({ queryKey: ['studies'] });
}

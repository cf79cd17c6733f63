import { useQuery, useSuspenseQueries } from '@tanstack/react-query';
import { useMemo } from 'react';
import { sessionQuery } from '../../access/api/access';
import { designSetQuery, limitsQuery } from '../../designs/api/design-set';
import { draftKey, useDrafts } from '../../designs/model/drafts';
import { costsQuery, ledgerQuery, studyQuery } from '../../studies/api/studies';
import { type Weighing, weighingOf } from '../model/weighing';

/** Asks for a study's parts at once and weighs its options, with the person's drafts; suspends until all are there. */
export function useWeighing(studyId: string): Weighing {
  const [study, ledger, costs, designSet, limits] = useSuspenseQueries({
    queries: [
      studyQuery(studyId),
      ledgerQuery(studyId),
      costsQuery(studyId),
      designSetQuery(studyId),
      limitsQuery(studyId),
    ],
  });
  const drafts = useDrafts((kept) => kept.drafts);
  const personId = useQuery(sessionQuery()).data?.id ?? '';
  return useMemo(
    () =>
      weighingOf({
        study: study.data,
        ledger: ledger.data,
        costs: costs.data,
        designSet: designSet.data,
        limits: limits.data,
        draftOf: (optionId) => drafts[draftKey(personId, optionId)],
      }),
    [study.data, ledger.data, costs.data, designSet.data, limits.data, drafts, personId],
  );
}

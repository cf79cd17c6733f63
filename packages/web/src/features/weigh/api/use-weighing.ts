import { useQuery, useSuspenseQueries } from '@tanstack/react-query';
import { useMemo, useState } from 'react';
import { sessionQuery } from '../../access/api/access';
import { designSetQuery, limitsQuery } from '../../designs/api/design-set';
import { draftKey, useDrafts } from '../../designs/model/drafts';
import { costsQuery, ledgerQuery, studyQuery } from '../../studies/api/studies';
import { type WeighedBefore, type Weighing, weighingOf } from '../model/weighing';

/**
 * Asks for a study's parts at once and weighs its options, with the person's drafts or as they are stored; suspends
 * until all are there.
 */
export function useWeighing(studyId: string, as: 'edited' | 'stored' = 'edited'): Weighing {
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
  const sizing = useDrafts((kept) => kept.sizings[draftKey(personId, studyId)]);
  const [before] = useState<WeighedBefore>(() => new Map());
  return useMemo(
    () =>
      weighingOf(
        {
          study: study.data,
          ledger: ledger.data,
          costs: costs.data,
          designSet: designSet.data,
          limits: limits.data,
          draftOf: (optionId) => (as === 'edited' ? drafts[draftKey(personId, optionId)] : undefined),
          sizing: as === 'edited' ? sizing : undefined,
        },
        before,
      ),
    [study.data, ledger.data, costs.data, designSet.data, limits.data, drafts, sizing, personId, before, as],
  );
}

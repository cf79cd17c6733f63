import { useSuspenseQueries } from '@tanstack/react-query';
import { useMemo } from 'react';
import { designSetQuery } from '../../designs/api/design-set';
import { costsQuery, ledgerQuery, studyQuery } from '../../studies/api/studies';
import { type Weighing, weighingOf } from '../model/weighing';

/** Asks for a study's four parts at once and weighs its options; suspends until all are there. */
export function useWeighing(studyId: string): Weighing {
  const [study, ledger, costs, designSet] = useSuspenseQueries({
    queries: [studyQuery(studyId), ledgerQuery(studyId), costsQuery(studyId), designSetQuery(studyId)],
  });
  return useMemo(
    () => weighingOf(study.data, ledger.data, costs.data, designSet.data),
    [study.data, ledger.data, costs.data, designSet.data],
  );
}

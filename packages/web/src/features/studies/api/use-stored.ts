import { useSuspenseQueries } from '@tanstack/react-query';
import { designSetQuery } from '../../designs/api/design-set';
import type { Stored } from '../model/effects';
import { costsQuery, ledgerQuery, studyQuery } from './studies';

/** Asks at once for all that a study's options are computed from; suspends until it is there. */
export function useStored(studyId: string): Stored {
  const [study, ledger, costs, designSet] = useSuspenseQueries({
    queries: [studyQuery(studyId), ledgerQuery(studyId), costsQuery(studyId), designSetQuery(studyId)],
  });
  return { study: study.data, ledger: ledger.data, costs: costs.data, designSet: designSet.data };
}

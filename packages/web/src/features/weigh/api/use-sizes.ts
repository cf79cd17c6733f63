import { useQuery } from '@tanstack/react-query';
import { sessionQuery } from '../../access/api/access';
import { holdSizes, undoSizes } from '../../designs/model/drafts-of-sizes';
import type { Weighing } from '../model/weighing';

/** Into trying out the sizes that the options have now, and out of it before something else is held. */
export function useSizes(weighing: Weighing) {
  const personId = useQuery(sessionQuery()).data?.id ?? '';
  return {
    hold: () => holdSizes(personId, weighing),
    undo: () => {
      if (weighing.sizing) undoSizes(personId, weighing);
    },
  };
}

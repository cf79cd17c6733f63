import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { ApiError } from './client';
import { messageOf } from './faults';

/** Changes to one study sent to the server: whether one is on its way, and what the server says against it. */
export function useChange(studyId: string) {
  const queryClient = useQueryClient();
  const [fault, setFault] = useState<string>();
  const [stale, setStale] = useState(false);
  const [busy, setBusy] = useState(false);

  const change = async (send: () => Promise<unknown>): Promise<boolean> => {
    setBusy(true);
    setFault(undefined);
    setStale(false);
    try {
      await send();
      return true;
    } catch (error) {
      if (!(error instanceof ApiError)) throw error;
      setFault(messageOf(error));
      setStale(error.problem.code === 'stale');
      return false;
    } finally {
      // After a refusal too: what is shown may be old, and a query finds out whether the session has ended.
      await queryClient.invalidateQueries({ queryKey: ['studies', studyId] });
      setBusy(false);
    }
  };
  return { change, fault, stale, busy };
}

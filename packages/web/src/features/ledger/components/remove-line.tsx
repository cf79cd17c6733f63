import { Button, makeStyles } from '@fluentui/react-components';
import type { PlanningValueView } from '@steelyard/api/contract/studies';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { messageOf } from '../../../shared/api/faults';
import { DialogBox } from '../../../shared/ui/dialog-box';
import { EffectsTable } from '../../studies/components/effects-table';
import { type Effect, effectsOf, type Stored } from '../../studies/model/effects';
import { keepLine, removePlanningValue } from '../api/ledger';
import type { Line } from '../model/lines';

const useStyles = makeStyles({
  body: { display: 'grid', gap: '12px' },
  actions: { display: 'flex', flexWrap: 'wrap', gap: '8px' },
});

interface RemoveLineProps {
  studyId: string;
  line: Line & { stored: PlanningValueView };
  stored: Stored;
  onRemoved: (effects: Effect[]) => void;
}

/** Takes back a value that one family has to itself, after showing what that does. */
export function RemoveLine({ studyId, line, stored, onRemoved }: RemoveLineProps) {
  const styles = useStyles();
  const queryClient = useQueryClient();
  const [asking, setAsking] = useState(false);
  const ledger = stored.ledger.filter(({ id }) => id !== line.stored.id);
  const removal = useMutation({
    mutationFn: () => removePlanningValue(studyId, line.stored),
    onSuccess: () => {
      const effects = effectsOf(stored, { ledger });
      keepLine(queryClient, studyId, line, null);
      onRemoved(effects);
    },
    // It may be that somebody else changed it, or that the session has ended.
    onError: () => queryClient.invalidateQueries({ queryKey: ['studies', studyId] }),
  });
  return (
    <>
      <Button aria-label={`Remove ${line.label}`} onClick={() => setAsking(true)}>
        Remove
      </Button>
      {asking && (
        <DialogBox title={`Remove ${line.label}?`} onClose={() => setAsking(false)}>
          {(close) => (
            <div className={styles.body}>
              <p>
                These designs then take the value that holds for every family. The study’s history keeps what
                it was.
              </p>
              <EffectsTable
                label="Options before and after"
                effects={effectsOf(stored, { ledger })}
                currency={stored.costs.costs.currency}
              />
              {removal.isError && <p role="alert">It was not removed. {messageOf(removal.error)}</p>}
              <div className={styles.actions}>
                <Button appearance="primary" onClick={() => removal.mutate()}>
                  Remove
                </Button>
                <Button onClick={close}>Keep it</Button>
              </div>
            </div>
          )}
        </DialogBox>
      )}
    </>
  );
}

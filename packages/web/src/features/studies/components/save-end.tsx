import { Button, makeStyles } from '@fluentui/react-components';
import type { Effect } from '../model/effects';
import { EffectsTable } from './effects-table';

const useStyles = makeStyles({
  actions: { display: 'flex', flexWrap: 'wrap', gap: '8px' },
});

interface SaveEndProps {
  verb: string;
  currency: string;
  kept: { changed: boolean; busy: boolean; discard: () => void };
  /** What the change as typed would do; undefined while it cannot be told. */
  effects: readonly Effect[] | undefined;
  /** What the change that was stored last did. */
  saved: readonly Effect[] | undefined;
}

/** The end of a form that moves every option: what it does to them, and the way to store or drop it. */
export function SaveEnd({ verb, currency, kept, effects, saved }: SaveEndProps) {
  const styles = useStyles();
  const { changed, busy, discard } = kept;
  return (
    <>
      {changed && effects && (
        <EffectsTable
          label="Options before and after the change, not saved"
          effects={effects}
          currency={currency}
        />
      )}
      {!changed && saved && (
        <EffectsTable label="Options before and after the change" effects={saved} currency={currency} saved />
      )}
      <div className={styles.actions}>
        <Button type="submit" appearance="primary" disabledFocusable={!changed || busy}>
          {verb}
        </Button>
        {changed && <Button onClick={discard}>Discard my changes</Button>}
      </div>
    </>
  );
}

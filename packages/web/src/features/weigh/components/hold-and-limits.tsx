import { Button, makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import { AddRegular, EditRegular } from '@fluentui/react-icons';
import type { Hold, LimitKey } from '@steelyard/calc';
import { Suspense, useState } from 'react';
import { useChange } from '../../../shared/api/use-change';
import { Chip } from '../../../shared/ui/chip';
import { lazily } from '../../../shared/ui/lazily';
import { onBar, ownTokens } from '../../../shared/ui/own-tokens';
import { Tip } from '../../../shared/ui/tip';
import { Word } from '../../../shared/ui/words';
import { putDesignSet } from '../../designs/api/design-set';
import { mayEdit } from '../../designs/model/rights';
import { useSizes } from '../api/use-sizes';
import { entersSizes } from '../model/enters-sizes';
import { holdInWords, holdMeanings } from '../model/hold-words';
import { limitChips } from '../model/standing-words';
import type { Weighing } from '../model/weighing';

const HoldDialog = lazily(async () => (await import('./hold-dialog')).HoldDialog);
const LimitsDialog = lazily(async () => (await import('./limits-dialog')).LimitsDialog);

const useStyles = makeStyles({
  bar: {
    display: 'flex',
    alignItems: 'center',
    flexWrap: 'wrap',
    gap: '8px 10px',
    marginBottom: '10px',
    color: tokens.colorNeutralForeground2,
    fontSize: '13px',
    lineHeight: '20px',
  },
  group: { display: 'flex', flexWrap: 'wrap', alignItems: 'center', gap: '6px 8px' },
  bare: { margin: 0, padding: 0, border: 'none', minWidth: 0 },
  add: { marginLeft: 'auto', '@media print': { display: 'none' } },
  segments: { display: 'flex', minWidth: 0 },
  segment: {
    minWidth: 0,
    borderRadius: 0,
    marginLeft: '-1px',
    fontWeight: 400,
    // On paper only what is held is of interest.
    '@media print': { display: 'none' },
    ':first-child': { borderRadius: '6px 0 0 6px' },
    ':last-child': { borderRadius: '0 6px 6px 0' },
  },
  held: {
    backgroundColor: ownTokens.bar,
    color: onBar.text,
    fontWeight: 700,
    '@media print': {
      display: 'inline-flex',
      border: `1px solid ${tokens.colorNeutralStroke1}`,
      borderRadius: '6px',
      backgroundColor: 'transparent',
      color: tokens.colorNeutralForeground1,
    },
    ':hover': { backgroundColor: ownTokens.bar, color: onBar.text },
    ':hover:active': { backgroundColor: ownTokens.bar, color: onBar.text },
  },
  chip: { minWidth: 0, fontWeight: 400 },
  pencil: { minWidth: 0, '@media print': { display: 'none' } },
  more: { minWidth: 0, fontWeight: 400, '@media print': { display: 'none' } },
  // On the screen a button stands there.
  onPaper: { display: 'none', '@media print': { display: 'list-item' } },
  fault: { flexBasis: '100%', color: tokens.colorStatusDangerForeground1 },
});

/** What is kept equal, and the most that exists of each thing; whoever may edit options may change both. */
export function HoldAndLimits({ weighing, onAdd }: { weighing: Weighing; onAdd: () => void }) {
  const styles = useStyles();
  const { study, designSet, hold, currency } = weighing;
  const { change, fault, busy } = useChange(study.id);
  const sizes = useSizes(weighing);
  const [editing, setEditing] = useState<'hold' | LimitKey | 'limits'>();
  const editable = mayEdit(study.role);
  const chips = limitChips(weighing);
  const settable = study.clusters ? 4 : 2;

  const choose = (kind: Hold['kind']) => {
    const next = holdOf(kind, weighing);
    if (!next) return setEditing('hold');
    if (kind === hold.kind) return;
    if (entersSizes(kind, weighing)) return sizes.hold();
    sizes.undo();
    if (kind !== designSet.hold.kind) {
      const order = designSet.options.map(({ id }) => id);
      void change(() => putDesignSet(study.id, { version: designSet.version, hold: next, order }));
    }
  };

  return (
    <div className={styles.bar}>
      <Word is="hold">Hold</Word>
      {editable ? (
        <fieldset className={mergeClasses(styles.group, styles.bare)} aria-label="Hold">
          <span className={styles.segments}>
            {kinds.map((kind) => (
              <Tip key={kind} says={holdMeanings[kind]}>
                <Button
                  size="small"
                  className={mergeClasses(styles.segment, kind === hold.kind && styles.held)}
                  aria-pressed={kind === hold.kind}
                  disabledFocusable={busy}
                  onClick={() => choose(kind)}
                >
                  {holdInWords(kind, hold, currency)}
                </Button>
              </Tip>
            ))}
          </span>
          <Button
            size="small"
            appearance="subtle"
            icon={<EditRegular />}
            className={styles.pencil}
            aria-label="Change what is held"
            onClick={() => setEditing('hold')}
          />
        </fieldset>
      ) : (
        <Chip>{holdInWords(hold.kind, hold, currency)}</Chip>
      )}
      <Word is="limit">Limits</Word>
      <ul className={styles.group} aria-label="Limits">
        {chips.map(({ limit, says }) => (
          <li key={limit}>
            {editable ? (
              <Button size="small" shape="circular" className={styles.chip} onClick={() => setEditing(limit)}>
                {says}
              </Button>
            ) : (
              <Chip>{says}</Chip>
            )}
          </li>
        ))}
        {chips.length === 0 && <li className={editable ? styles.onPaper : undefined}>none set</li>}
        {editable && chips.length < settable && (
          <li>
            <Button
              size="small"
              appearance="subtle"
              className={styles.more}
              onClick={() => setEditing('limits')}
            >
              {chips.length === 0 ? 'Set limits' : 'More limits'}
            </Button>
          </li>
        )}
      </ul>
      {editable && (
        <Button size="small" icon={<AddRegular />} className={styles.add} onClick={onAdd}>
          Add option
        </Button>
      )}
      {fault && (
        <p role="alert" className={styles.fault}>
          {fault}
        </p>
      )}
      <Suspense>
        {editing === 'hold' && <HoldDialog weighing={weighing} onClose={() => setEditing(undefined)} />}
        {editing && editing !== 'hold' && (
          <LimitsDialog
            weighing={weighing}
            first={editing === 'limits' ? undefined : editing}
            onClose={() => setEditing(undefined)}
          />
        )}
      </Suspense>
    </div>
  );
}

const kinds = ['power', 'budget', 'sizes'] as const;

/** The hold that a segment stands for; a budget that nobody has stated begins at the limit of money. */
function holdOf(kind: Hold['kind'], { designSet: { hold }, limits }: Weighing): Hold | undefined {
  if (kind !== 'budget') return { kind, power: hold.power };
  const budget = hold.kind === 'budget' ? hold.budget : limits.limits.money;
  return budget ? { kind, power: hold.power, budget } : undefined;
}

import { Button, makeStyles, tokens } from '@fluentui/react-components';
import { useQueryClient } from '@tanstack/react-query';
import { useChange } from '../../../shared/api/use-change';
import { list } from '../../../shared/format/lists';
import { count } from '../../../shared/format/numbers';
import { ownTokens } from '../../../shared/ui/own-tokens';
import type { PlanSize } from '../../designs/model/drafts';
import { isPending, resized, undoSizes } from '../../designs/model/drafts-of-sizes';
import { holdInWords } from '../../weigh/model/hold-words';
import type { Weighed, Weighing } from '../../weigh/model/weighing';
import { conflicting, saveSizes } from '../api/save-sizes';

const useStyles = makeStyles({
  bar: {
    display: 'flex',
    flexWrap: 'wrap',
    alignItems: 'center',
    gap: '6px 10px',
    padding: '8px 14px',
    borderTop: `1px solid ${tokens.colorNeutralStroke2}`,
    borderRadius: '0 0 9px 9px',
    backgroundColor: ownTokens.chosen,
    boxShadow: `inset 3px 0 ${tokens.colorBrandForeground1}`,
    fontSize: '13px',
    lineHeight: '18px',
    '@media print': { display: 'none' },
  },
  words: { flex: '1 1 240px', minWidth: 0, overflowWrap: 'anywhere' },
  fault: { flexBasis: '100%', color: tokens.colorStatusDangerForeground1 },
});

interface SizesBarProps {
  weighing: Weighing;
  personId: string;
  /** The sizes were saved, or given up. */
  onDone: (what: 'saved' | 'undone') => void;
}

/** Sizes that are tried out and not stored: back to those before, or keep them. */
export function SizesBar({ weighing, personId, onDone }: SizesBarProps) {
  const styles = useStyles();
  const queryClient = useQueryClient();
  const { study, designSet, options, sizing } = weighing;
  const { change, fault, busy } = useChange(study.id);
  if (!sizing || !isPending(weighing)) return null;
  const disputed = conflicting(options).map(({ letter }) => letter);
  const sizes = list(resized(options).map((option) => sizeInWords(option, sizing.before[option.id])));
  const held = `Held now: the sizes${sizes && ` ${sizes}`}; stored: ${storedHold(weighing)}.`;
  const says = designSet.hold.kind === 'sizes' ? `${sizes}.` : held;

  const save = async () => {
    if (await change(() => saveSizes(weighing, personId, queryClient))) onDone('saved');
  };
  return (
    <section aria-label="Sizes not saved" className={styles.bar}>
      <p className={styles.words}>
        {says} Not saved.
        {disputed.length > 0 &&
          ` Somebody else changed ${list(disputed)} meanwhile: settle that in the option’s own form first.`}
      </p>
      <Button
        size="small"
        onClick={() => {
          undoSizes(personId, weighing);
          onDone('undone');
        }}
      >
        Undo
      </Button>
      <Button size="small" disabledFocusable={busy || disputed.length > 0} onClick={() => void save()}>
        Save the sizes
      </Button>
      {fault && (
        <p role="alert" className={styles.fault}>
          {fault}
        </p>
      )}
    </section>
  );
}

const storedHold = ({ designSet: { hold }, currency }: Weighing): string =>
  holdInWords(hold.kind, hold, currency);

/** “B 28”, or “B 28 instead of 30” where a size was stated before. */
function sizeInWords({ letter, draft }: Weighed, before: PlanSize | undefined): string {
  const [is, was] = [shown(draft?.plan), shown(before)];
  return `${letter} ${is}${before?.units === undefined || is === was ? '' : ` instead of ${was}`}`;
}

function shown({ units, clusterSize }: PlanSize = {}): string {
  return [units, clusterSize].flatMap((size) => (size === undefined ? [] : [count(size)])).join(' × ');
}

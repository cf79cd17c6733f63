import { Button, makeStyles, tokens } from '@fluentui/react-components';
import { ArrowUndoRegular } from '@fluentui/react-icons';
import { useChange } from '../../../shared/api/use-change';
import { Moment } from '../../../shared/ui/moment';
import type { Weighing } from '../../weigh/model/weighing';
import { restoreOption } from '../api/options';

const useStyles = makeStyles({
  removed: {
    marginTop: '10px',
    color: tokens.colorNeutralForeground2,
    fontSize: '13px',
    lineHeight: '20px',
    '@media print': { display: 'none' },
  },
  line: {
    display: 'flex',
    flexWrap: 'wrap',
    alignItems: 'center',
    gap: '4px 10px',
    overflowWrap: 'anywhere',
  },
});

/** Options that were removed; each can be brought back. */
export function RemovedOptions({ weighing }: { weighing: Weighing }) {
  const styles = useStyles();
  const { study, designSet } = weighing;
  const { change, fault, busy } = useChange(study.id);
  if (designSet.removed.length === 0) return null;
  return (
    <section aria-label="Removed options" className={styles.removed}>
      <ul>
        {designSet.removed.map((option) => (
          <li key={option.id} className={styles.line}>
            <span>
              {option.name} was removed <Moment iso={option.removedAt} />.
            </span>
            <Button
              size="small"
              icon={<ArrowUndoRegular />}
              disabledFocusable={busy}
              aria-label={`Undo removing ${option.name}`}
              onClick={() => void change(() => restoreOption(study.id, option))}
            >
              Undo
            </Button>
          </li>
        ))}
      </ul>
      {fault && <p role="alert">{fault}</p>}
    </section>
  );
}

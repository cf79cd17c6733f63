import { Button, makeStyles, tokens } from '@fluentui/react-components';
import { ArrowDownRegular, ArrowUpRegular, CopyRegular, DeleteRegular } from '@fluentui/react-icons';
import { useChange } from '../../../shared/api/use-change';
import { putDesignSet } from '../../designs/api/design-set';
import type { Weighed, Weighing } from '../../weigh/model/weighing';
import { duplicateOption, removeOption } from '../api/options';

const useStyles = makeStyles({
  actions: { display: 'flex', flexWrap: 'wrap', gap: '6px', marginTop: '14px' },
  fault: { color: tokens.colorStatusDangerForeground1, flexBasis: '100%' },
});

interface OptionActionsProps {
  option: Weighed;
  weighing: Weighing;
  /** Shows another option: the copy, or the first after a removal. */
  onSelect: (optionId?: string) => void;
}

/** What may be done with an option as a whole. */
export function OptionActions({ option, weighing, onSelect }: OptionActionsProps) {
  const styles = useStyles();
  const { study, designSet } = weighing;
  const { change, fault, busy } = useChange(study.id);
  const order = designSet.options.map(({ id }) => id);
  const { id, position } = option;

  const move = (to: number) => {
    const next = order.toSpliced(position, 1).toSpliced(to, 0, id);
    void change(() =>
      putDesignSet(study.id, { version: designSet.version, hold: designSet.hold, order: next }),
    );
  };
  const duplicate = () => change(async () => onSelect((await duplicateOption(study.id, id)).id));
  const remove = async () => {
    if (await change(() => removeOption(study.id, option.stored))) onSelect();
  };

  return (
    <div className={styles.actions}>
      <Button size="small" icon={<CopyRegular />} disabledFocusable={busy} onClick={() => void duplicate()}>
        Duplicate
      </Button>
      <Button
        size="small"
        icon={<ArrowUpRegular />}
        disabledFocusable={busy || position === 0}
        onClick={() => move(position - 1)}
      >
        Move up
      </Button>
      <Button
        size="small"
        icon={<ArrowDownRegular />}
        disabledFocusable={busy || position === order.length - 1}
        onClick={() => move(position + 1)}
      >
        Move down
      </Button>
      <Button size="small" icon={<DeleteRegular />} disabledFocusable={busy} onClick={() => void remove()}>
        Remove
      </Button>
      {fault && (
        <p role="alert" className={styles.fault}>
          {fault}
        </p>
      )}
    </div>
  );
}

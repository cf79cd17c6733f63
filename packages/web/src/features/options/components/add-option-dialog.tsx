import { Button, makeStyles, tokens } from '@fluentui/react-components';
import type { StudyView } from '@steelyard/api/contract/studies';
import { useId } from 'react';
import { useChange } from '../../../shared/api/use-change';
import { DialogBox } from '../../../shared/ui/dialog-box';
import type { FamilyUi } from '../../designs/families/family-ui';
import { familyUis } from '../../designs/families/registry';
import { addOption } from '../api/options';

const useStyles = makeStyles({
  families: { display: 'grid', gap: '8px' },
  family: {
    display: 'grid',
    justifyItems: 'start',
    justifyContent: 'start',
    width: '100%',
    padding: '10px 12px',
    textAlign: 'start',
    fontWeight: 400,
  },
  name: { display: 'block', fontWeight: 700 },
  says: { display: 'block', color: tokens.colorNeutralForeground2, fontSize: '13px', lineHeight: '18px' },
  actions: { display: 'flex', justifyContent: 'flex-end', marginTop: '12px' },
  fault: { marginBottom: '8px', color: tokens.colorStatusDangerForeground1 },
});

interface AddOptionDialogProps {
  study: StudyView;
  /** Names in use, which the new one's differs from. */
  taken: readonly string[];
  onAdded: (optionId: string) => void;
  onClose: () => void;
}

/** The families of designs, each in one line; the one chosen becomes an option that can be computed at once. */
export function AddOptionDialog({ study, taken, onAdded, onClose }: AddOptionDialogProps) {
  const styles = useStyles();
  const { change, fault, busy } = useChange(study.id);
  const add = (family: FamilyUi, close: () => void) =>
    change(async () => {
      const body = { name: freeName(family.name, taken), plan: family.start(study) };
      const { id } = await addOption(study.id, body);
      close();
      onAdded(id);
    });
  return (
    <DialogBox title="Add an option" onClose={onClose}>
      {(close) => (
        <>
          {fault && (
            <p role="alert" className={styles.fault}>
              {fault}
            </p>
          )}
          <ul className={styles.families}>
            {Object.entries(familyUis).map(([id, family]) => (
              <li key={id}>
                <FamilyChoice
                  family={family}
                  refusal={family.refusal(study)}
                  busy={busy}
                  onChoose={() => void add(family, close)}
                />
              </li>
            ))}
          </ul>
          <div className={styles.actions}>
            <Button onClick={close}>Cancel</Button>
          </div>
        </>
      )}
    </DialogBox>
  );
}

interface FamilyChoiceProps {
  family: FamilyUi;
  refusal: string | undefined;
  busy: boolean;
  onChoose: () => void;
}

function FamilyChoice({ family, refusal, busy, onChoose }: FamilyChoiceProps) {
  const styles = useStyles();
  const says = useId();
  return (
    <Button
      className={styles.family}
      disabledFocusable={busy || refusal !== undefined}
      aria-label={family.name}
      aria-describedby={says}
      onClick={onChoose}
    >
      <span className={styles.name}>{family.name}</span>
      <span id={says} className={styles.says}>
        {family.describes} {refusal}
      </span>
    </Button>
  );
}

function freeName(name: string, taken: readonly string[]): string {
  for (let number = 2, free = name; ; number += 1) {
    if (!taken.includes(free)) return free;
    free = `${name} ${number}`;
  }
}

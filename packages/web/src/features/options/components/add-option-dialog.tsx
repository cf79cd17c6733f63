import { Button, makeStyles, tokens } from '@fluentui/react-components';
import type { StudyView } from '@steelyard/api/contract/studies';
import { type FamilyId, familyIds } from '@steelyard/calc';
import { useId, useState } from 'react';
import { useChange } from '../../../shared/api/use-change';
import { DialogBox } from '../../../shared/ui/dialog-box';
import { TitledSection } from '../../../shared/ui/titled-section';
import { familyUiOf, refusalOf } from '../../designs/families/registry';
import { objections } from '../../designs/model/circumstances';
import { keepCircumstances, useKnownCircumstances } from '../../designs/model/known-circumstances';
import { mayDecide } from '../../designs/model/rights';
import { addOption } from '../api/options';
import { freeName } from '../model/free-name';
import { AddAllTheSame } from './add-all-the-same';
import { CircumstanceFields } from './circumstance-fields';

const useStyles = makeStyles({
  parts: { display: 'grid', gap: '18px' },
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
  actions: { display: 'flex', justifyContent: 'flex-end' },
  fault: { color: tokens.colorStatusDangerForeground1 },
});

interface AddOptionDialogProps {
  study: StudyView;
  /** Names in use, which the new one's differs from. */
  taken: readonly string[];
  onAdded: (optionId: string) => void;
  onClose: () => void;
}

const nothingKnown = {};

/** From what the question allows to the designs it admits; any other may be added with a ruling. */
export function AddOptionDialog({ study, taken, onAdded, onClose }: AddOptionDialogProps) {
  const styles = useStyles();
  const known = useKnownCircumstances(({ studies }) => studies[study.id] ?? nothingKnown);
  const [ruled, setRuled] = useState<FamilyId>();
  const { change, fault, busy } = useChange(study.id);
  const startOf = (family: FamilyId) => {
    const face = familyUiOf(family);
    return { name: freeName(face.name, taken), plan: { family, ...face.start(study) } };
  };
  const add = (family: FamilyId, close: () => void) =>
    change(async () => {
      const { id } = await addOption(study.id, startOf(family));
      close();
      onAdded(id);
    });
  const judged = familyIds.map((family) => ({
    family,
    refusal: refusalOf(family, study),
    against: objections(familyUiOf(family).suits, known).join(' '),
  }));
  const admitted = judged.filter(({ refusal, against }) => refusal === undefined && against === '');
  const others = judged.filter((each) => !admitted.includes(each));

  return (
    <DialogBox title="Add an option" onClose={onClose}>
      {(close) => (
        <div className={styles.parts}>
          {fault && (
            <p role="alert" className={styles.fault}>
              {fault}
            </p>
          )}
          <TitledSection level={3} title="What the question allows">
            <CircumstanceFields known={known} onChange={(next) => keepCircumstances(study.id, next)} />
          </TitledSection>
          <TitledSection level={3} title="Designs that these answers admit">
            {admitted.length === 0 && <p>None: see below what speaks against each.</p>}
            <ul className={styles.families}>
              {admitted.map(({ family }) => (
                <li key={family}>
                  <FamilyChoice family={family} disabled={busy} onChoose={() => void add(family, close)} />
                </li>
              ))}
            </ul>
          </TitledSection>
          {others.length > 0 && (
            <TitledSection level={3} title="Not proposed, and why">
              <ul className={styles.families}>
                {others.map(({ family, refusal, against }) => (
                  <li key={family}>
                    {ruled === family ? (
                      <AddAllTheSame
                        studyId={study.id}
                        {...startOf(family)}
                        against={against}
                        onAdded={(optionId) => {
                          close();
                          onAdded(optionId);
                        }}
                        onCancel={() => setRuled(undefined)}
                      />
                    ) : (
                      <FamilyChoice
                        family={family}
                        disabled={busy || refusal !== undefined || !mayDecide(study.role)}
                        against={refusal ?? `${against} ${withRuling(study)}`}
                        onChoose={() => setRuled(family)}
                      />
                    )}
                  </li>
                ))}
              </ul>
            </TitledSection>
          )}
          <div className={styles.actions}>
            <Button onClick={close}>Cancel</Button>
          </div>
        </div>
      )}
    </DialogBox>
  );
}

const withRuling = ({ role }: StudyView) =>
  mayDecide(role) ? 'It can be added with a ruling.' : 'A methodologist can add it with a ruling.';

interface FamilyChoiceProps {
  family: FamilyId;
  disabled: boolean;
  against?: string;
  onChoose: () => void;
}

function FamilyChoice({ family, disabled, against, onChoose }: FamilyChoiceProps) {
  const styles = useStyles();
  const says = useId();
  const { name, describes } = familyUiOf(family);
  return (
    <Button
      className={styles.family}
      disabledFocusable={disabled}
      aria-label={name}
      aria-describedby={says}
      onClick={onChoose}
    >
      <span className={styles.name}>{name}</span>
      <span id={says} className={styles.says}>
        {describes} {against}
      </span>
    </Button>
  );
}

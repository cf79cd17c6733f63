import { Button, makeStyles, tokens } from '@fluentui/react-components';
import type { ChoiceView } from '@steelyard/api/contract/design-sets';
import { useId } from 'react';
import { useChange } from '../../../shared/api/use-change';
import { Moment } from '../../../shared/ui/moment';
import { OptionTag } from '../../../shared/ui/option-tag';
import { Word } from '../../../shared/ui/words';
import { mayDecide } from '../../designs/model/rights';
import type { Weighing } from '../../weigh/model/weighing';
import { withdrawChoice } from '../api/options';

const useStyles = makeStyles({
  card: {
    marginTop: '12px',
    padding: '12px 14px',
    border: `1px solid ${tokens.colorNeutralStroke2}`,
    borderRadius: '10px',
    backgroundColor: tokens.colorNeutralBackground1,
    overflowWrap: 'anywhere',
    '@media print': { breakInside: 'avoid' },
  },
  heading: {
    marginBottom: '6px',
    color: tokens.colorBrandForeground1,
    fontSize: '13px',
    lineHeight: '18px',
    fontWeight: 700,
  },
  why: { whiteSpace: 'pre-line' },
  chosen: { display: 'flex', alignItems: 'center', gap: '10px', marginBottom: '6px', fontWeight: 700 },
  others: { display: 'grid', gap: '6px', margin: '10px 0' },
  other: { display: 'grid', gridTemplateColumns: 'auto minmax(0, 1fr)', gap: '10px' },
  foot: {
    display: 'flex',
    flexWrap: 'wrap',
    gap: '8px',
    alignItems: 'center',
    justifyContent: 'space-between',
  },
  actions: { '@media print': { display: 'none' } },
  note: { color: tokens.colorNeutralForeground2, fontSize: '13px' },
});

/** The choice as it is recorded: which, why, and why not each other. */
export function Choice({ weighing, onChange }: { weighing: Weighing; onChange: () => void }) {
  const styles = useStyles();
  const heading = useId();
  const { study, designSet, options } = weighing;
  const { choice, version } = designSet;
  const { change, fault, busy } = useChange(study.id);
  const chosen = options.find(({ id }) => id === choice?.optionId);
  if (!choice || !chosen) return null;
  return (
    <section aria-labelledby={heading} className={styles.card}>
      <h2 id={heading} className={styles.heading}>
        <Word is="choice">Choice</Word>
      </h2>
      <p className={styles.chosen}>
        <OptionTag letter={chosen.letter} position={chosen.position} />
        {chosen.name}
      </p>
      <p className={styles.why}>{choice.why}</p>
      <ul className={styles.others} aria-label="Why not the others">
        {reasonsAgainst(weighing, choice).map(({ option, why }) => (
          <li key={option.id} className={styles.other}>
            <OptionTag
              small
              letter={option.letter}
              position={option.position}
              outlined={option.ruling?.kind === 'not-admissible'}
            />
            <span className={styles.why}>
              Not {option.name}: {why}
            </span>
          </li>
        ))}
      </ul>
      <div className={styles.foot}>
        <p className={styles.note}>
          Recorded by {choice.by}, <Moment iso={choice.at} />
        </p>
        {mayDecide(study.role) && (
          <span className={styles.actions}>
            <Button size="small" onClick={onChange}>
              Change
            </Button>{' '}
            <Button
              size="small"
              disabledFocusable={busy}
              onClick={() => void change(() => withdrawChoice(study.id, version))}
            >
              Withdraw
            </Button>
          </span>
        )}
      </div>
      {fault && <p role="alert">{fault}</p>}
    </section>
  );
}

/** Why not each other option: the reason recorded, else the ruling against it. */
function reasonsAgainst({ options }: Weighing, { optionId, whyNot }: ChoiceView) {
  return options.flatMap((option) => {
    if (option.id === optionId) return [];
    const recorded = whyNot.find((reason) => reason.optionId === option.id)?.why;
    const why = recorded ?? (option.ruling && `ruled out. ${option.ruling.reason}`);
    return why ? [{ option, why }] : [];
  });
}

import { makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import { capitalised, counted } from '../../../shared/format/lists';
import { figure, percent, withUnit } from '../../../shared/format/numbers';
import { ownTokens } from '../../../shared/ui/own-tokens';
import { Word } from '../../../shared/ui/words';
import type { Weighing } from '../model/weighing';

const useStyles = makeStyles({
  question: {
    fontSize: '19px',
    lineHeight: '26px',
    fontWeight: 700,
    overflowWrap: 'anywhere',
    '@media (max-width: 640px)': { fontSize: '17px', lineHeight: '23px' },
  },
  sub: { marginBottom: '10px', color: tokens.colorNeutralForeground2, fontSize: '13px', lineHeight: '20px' },
  verdict: {
    padding: '10px 14px',
    marginBottom: '10px',
    border: `1px solid ${tokens.colorNeutralStroke2}`,
    borderLeft: `4px solid ${tokens.colorBrandForeground1}`,
    borderRadius: '8px',
    backgroundColor: tokens.colorNeutralBackground1,
    fontSize: '15px',
    lineHeight: '22px',
    overflowWrap: 'anywhere',
    '@media (max-width: 640px)': { fontSize: '14px', lineHeight: '20px', padding: '8px 12px' },
  },
  amiss: { borderLeft: `4px solid ${ownTokens.over}` },
  label: { color: tokens.colorNeutralForeground2, fontSize: '13px', lineHeight: '18px' },
  hold: {
    display: 'flex',
    alignItems: 'center',
    flexWrap: 'wrap',
    gap: '4px 10px',
    marginBottom: '10px',
    color: tokens.colorNeutralForeground2,
    fontSize: '13px',
    lineHeight: '20px',
  },
});

/** The question with what it is planned on, the verdict, and what is held equal. */
export function WeighHead({ weighing }: { weighing: Weighing }) {
  const styles = useStyles();
  const { study, verdict, hold, currency, options } = weighing;
  const standing = options.some(({ appraisal }) => appraisal?.feasible);
  return (
    <>
      <h1 className={styles.question}>{study.question}</h1>
      <p className={styles.sub}>{subLine(weighing)}</p>
      <section aria-label="Verdict" className={mergeClasses(styles.verdict, !standing && styles.amiss)}>
        <p className={styles.label}>
          <Word is="verdict">Verdict</Word>
        </p>
        <p>
          <strong>{verdict.headline}</strong> {verdict.detail}
        </p>
      </section>
      {options.length > 0 && (
        <p className={styles.hold}>
          <Word is="hold">Hold</Word>
          {hold.kind === 'power' ? (
            <Word is="holdPower" chip>
              Power {percent(hold.power)}
            </Word>
          ) : (
            <Word is="holdSizes" chip>
              Sizes
            </Word>
          )}
          <span>Money in {currency}</span>
        </p>
      )}
    </>
  );
}

function subLine({ study, ledger, options }: Weighing): string {
  const { plan, outcomeLabel, outcomeUnit } = study;
  const general = (key: 'sd' | 'controlProportion') =>
    ledger.find((line) => line.key === key && line.family === null)?.value;
  const sd = general('sd');
  const control = general('controlProportion');
  const { alpha, sides } = plan.test;
  return [
    capitalised(outcomeLabel),
    ...(plan.outcome.kind === 'continuous' && sd !== undefined
      ? [`SD ${withUnit(figure(sd), outcomeUnit)}`]
      : []),
    ...(plan.outcome.kind === 'binary' && control !== undefined ? [`control ${percent(control)}`] : []),
    `${sides === 2 ? 'two-sided' : 'one-sided'} ${percent(alpha)}`,
    counted(options.length, 'option', 'options'),
  ].join(' · ');
}

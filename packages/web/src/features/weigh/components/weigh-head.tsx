import { makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import type { ReactNode } from 'react';
import { capitalised, counted } from '../../../shared/format/lists';
import { figure, percent, withUnit } from '../../../shared/format/numbers';
import { ownTokens } from '../../../shared/ui/own-tokens';
import { marginInWords } from '../../question/model/margin-words';
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
    display: 'flex',
    flexWrap: 'wrap',
    alignItems: 'center',
    gap: '8px 14px',
    padding: '11px 14px',
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
  fits: { borderLeft: `4px solid ${ownTokens.fits}` },
  amiss: { borderLeft: `4px solid ${ownTokens.over}` },
  action: { '@media print': { display: 'none' } },
  words: { flex: '1 1 260px', minWidth: 0 },
});

/** The question with what it is planned on, the verdict with what may be done about it, and what follows. */
export function WeighHead({
  weighing,
  action,
  children,
}: {
  weighing: Weighing;
  action?: ReactNode;
  children?: ReactNode;
}) {
  const styles = useStyles();
  const { study, verdict, options } = weighing;
  const admitted = options.filter(({ ruling }) => ruling?.kind !== 'not-admissible');
  const fits = admitted.some(({ standing }) => standing?.fits && standing.uses.length > 0);
  const amiss = !admitted.some(({ standing }) => standing?.fits);
  return (
    <>
      <h1 className={styles.question}>{study.question}</h1>
      <p className={styles.sub}>{subLine(weighing)}</p>
      <section
        aria-label="Verdict"
        className={mergeClasses(styles.verdict, fits && styles.fits, amiss && styles.amiss)}
      >
        <div className={styles.words}>
          <p>
            <strong>{verdict.headline}</strong> {verdict.detail}
          </p>
        </div>
        {action && <div className={styles.action}>{action}</div>}
      </section>
      {children}
    </>
  );
}

function subLine({ study, ledger, options }: Weighing): string {
  const { plan, outcomeLabel, outcomeUnit } = study;
  const general = (key: 'sd' | 'controlProportion') =>
    ledger.find((line) => line.key === key && line.family === null)?.value;
  const sd = general('sd');
  const control = general('controlProportion');
  const { alpha, sides, hypothesis } = plan.test;
  const margin = marginInWords(study);
  return [
    capitalised(outcomeLabel),
    ...(plan.outcome.kind === 'continuous' && sd !== undefined
      ? [`SD ${withUnit(figure(sd), outcomeUnit)}`]
      : []),
    ...(plan.outcome.kind === 'binary' && control !== undefined ? [`control ${percent(control)}`] : []),
    ...(margin === undefined ? [] : [`${hypothesis}, margin ${margin}`]),
    `${sides === 2 ? 'two-sided' : 'one-sided'} ${percent(alpha)}`,
    counted(options.length, 'option', 'options') + ruledOut(options),
  ].join(' · ');
}

function ruledOut(options: Weighing['options']): string {
  const many = options.filter(({ ruling }) => ruling?.kind === 'not-admissible').length;
  return many === 0 ? '' : `, ${counted(many, 'not admissible', 'not admissible')}`;
}

import { makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import type { Step } from '@steelyard/calc';
import { figure } from '../../../shared/format/numbers';
import { ScrollRegion } from '../../../shared/ui/scroll-region';
import { Maths } from './maths';

const stacked = '@media (max-width: 900px)';

const useStyles = makeStyles({
  card: {
    border: `1px solid ${tokens.colorNeutralStroke2}`,
    borderRadius: '10px',
    backgroundColor: tokens.colorNeutralBackground1,
  },
  table: { width: '100%', [stacked]: { display: 'block' } },
  heads: { [stacked]: { display: 'none' } },
  head: {
    padding: '6px 16px',
    color: tokens.colorNeutralForeground2,
    fontSize: '13px',
    lineHeight: '20px',
  },
  step: {
    borderTop: `1px solid ${tokens.colorNeutralStroke2}`,
    breakInside: 'avoid',
    [stacked]: { display: 'grid', rowGap: '4px', padding: '10px 14px' },
  },
  cell: { padding: '9px 16px', [stacked]: { padding: 0 } },
  // One above the other, so that a long line leaves the value beside it in sight.
  maths: { display: 'grid', gap: '8px' },
  label: { width: '30%', minWidth: '210px', [stacked]: { width: 'auto', maxWidth: 'calc(100vw - 60px)' } },
  name: { display: 'block', fontWeight: 700, lineHeight: '18px' },
  source: {
    display: 'block',
    color: tokens.colorNeutralForeground2,
    fontSize: '13px',
    lineHeight: '17px',
  },
  value: {
    position: 'sticky',
    right: 0,
    backgroundColor: tokens.colorNeutralBackground1,
    fontSize: '16px',
    fontWeight: 700,
    textAlign: 'end',
    whiteSpace: 'nowrap',
    [stacked]: { position: 'static', textAlign: 'start', '::before': { content: '"= "' } },
  },
  valueHead: {
    position: 'sticky',
    right: 0,
    backgroundColor: tokens.colorNeutralBackground1,
    textAlign: 'end',
  },
});

/** The arithmetic as a statistician would write it down: formula, figures put in, value, source. */
export function Steps({ steps, arms }: { steps: readonly Step[]; arms: readonly string[] }) {
  const styles = useStyles();
  return (
    <ScrollRegion label="Steps, scrolls sideways" className={styles.card}>
      <table className={styles.table} aria-label="Working, step by step">
        <thead className={styles.heads}>
          <tr>
            <th className={styles.head}>Step and source</th>
            <th className={styles.head}>Formula, and with the figures</th>
            <th className={mergeClasses(styles.head, styles.valueHead)}>Value</th>
          </tr>
        </thead>
        <tbody>
          {steps.map(({ label, formula, substituted, value, source }) => (
            <tr key={label} className={styles.step}>
              <th scope="row" className={mergeClasses(styles.cell, styles.label)}>
                <span className={styles.name}>{withArms(label, arms)}</span>{' '}
                <span className={styles.source}>{source}</span>
              </th>
              <td className={styles.cell}>
                <div className={styles.maths}>
                  <Maths tex={formula} />
                  <Maths tex={substituted} />
                </div>
              </td>
              <td className={mergeClasses(styles.cell, styles.value)}>{figure(value)}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </ScrollRegion>
  );
}

/** “Power, Active 2 against Control” with the arms by the study’s own names. */
const withArms = (label: string, arms: readonly string[]): string =>
  label
    .replace(/\bactive (\d+)\b/gi, (found, arm) => arms[Number(arm)] ?? found)
    .replace(/against Control\b/, `against ${arms[0] ?? 'Control'}`);

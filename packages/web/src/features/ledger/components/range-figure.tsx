import { makeStyles, tokens } from '@fluentui/react-components';

const useStyles = makeStyles({
  figure: { display: 'block', width: '120px', height: '14px', maxWidth: '100%' },
  track: { stroke: tokens.colorNeutralStroke1, strokeWidth: '3px', strokeLinecap: 'round' },
  mark: { fill: tokens.colorBrandForeground1 },
});

/** Where a value lies in its range; the figures beside it say the same. */
export function RangeFigure({ value, low, high }: { value: number; low: number; high: number }) {
  const styles = useStyles();
  const share = high > low ? (value - low) / (high - low) : 0.5;
  return (
    <svg viewBox="0 0 120 14" className={styles.figure} aria-hidden="true">
      <line x1="6" x2="114" y1="7" y2="7" className={styles.track} />
      <circle cx={6 + 108 * share} cy="7" r="5" className={styles.mark} />
    </svg>
  );
}

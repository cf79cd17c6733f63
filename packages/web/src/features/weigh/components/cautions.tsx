import { makeStyles, tokens } from '@fluentui/react-components';
import type { Caution } from '@steelyard/calc';

const useStyles = makeStyles({
  cautions: { display: 'grid', gap: '8px', fontSize: '13px', lineHeight: '18px', overflowWrap: 'anywhere' },
  source: { color: tokens.colorNeutralForeground2 },
});

export function Cautions({ cautions }: { cautions: readonly Caution[] }) {
  const styles = useStyles();
  return (
    <ul className={styles.cautions}>
      {cautions.map(({ code, message, source }) => (
        <li key={code}>
          {message} {source && <span className={styles.source}>{source}.</span>}
        </li>
      ))}
    </ul>
  );
}

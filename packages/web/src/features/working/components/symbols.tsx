import { makeStyles, tokens } from '@fluentui/react-components';
import type { SymbolMeaning } from '../model/symbols';
import { Maths } from './maths';

const useStyles = makeStyles({
  list: {
    display: 'grid',
    gridTemplateColumns: 'repeat(auto-fill, minmax(min(100%, 340px), 1fr))',
    gap: '4px 24px',
    marginTop: '10px',
    color: tokens.colorNeutralForeground2,
    fontSize: '13px',
    lineHeight: '18px',
  },
  item: { display: 'grid', gridTemplateColumns: '84px minmax(0, 1fr)', alignItems: 'center', gap: '10px' },
});

/** What the letters of the working stand for. */
export function Symbols({ symbols }: { symbols: readonly SymbolMeaning[] }) {
  const styles = useStyles();
  return (
    <dl aria-label="Symbols" className={styles.list}>
      {symbols.map(({ tex, says }) => (
        <div key={tex + says} className={styles.item}>
          <dt>
            <Maths tex={tex} />
          </dt>
          <dd>{says}</dd>
        </div>
      ))}
    </dl>
  );
}

import { makeStyles } from '@fluentui/react-components';

const useStyles = makeStyles({
  brand: { display: 'inline-flex', alignItems: 'center', gap: '14px' },
  name: { fontWeight: 900, letterSpacing: '0.3px', fontSize: '16px', lineHeight: '22px' },
});

/** The balance and the name, for dark ground. */
export function Brand() {
  const styles = useStyles();
  return (
    <span className={styles.brand}>
      <svg width="30" height="22" viewBox="0 0 30 22" aria-hidden="true" focusable="false">
        <path d="M2 7L28 3" stroke="#d9b26a" strokeWidth="2.4" strokeLinecap="round" />
        <path d="M11 5.6V1.5" stroke="#d9b26a" strokeWidth="2" />
        <path d="M3.5 7v6.5m-3 3a3 3 0 0 0 6 0z" stroke="#fff" strokeWidth="1.4" fill="#fff" />
        <rect x="20.5" y="4.6" width="5" height="7" rx="1.2" fill="#d9b26a" />
      </svg>
      <span className={styles.name}>Steelyard</span>
    </span>
  );
}

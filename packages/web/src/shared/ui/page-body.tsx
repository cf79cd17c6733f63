import { makeStyles, tokens } from '@fluentui/react-components';
import type { ReactNode } from 'react';

const useStyles = makeStyles({
  body: {
    maxWidth: '1040px',
    marginInline: 'auto',
    padding: '24px 20px 48px',
    '@media (min-width: 1760px)': { maxWidth: '1280px' },
    '@media (max-width: 640px)': { padding: '16px 12px 32px' },
  },
  heading: { fontSize: '22px', lineHeight: '30px', fontWeight: 700, overflowWrap: 'anywhere' },
  sub: { color: tokens.colorNeutralForeground2, marginBottom: '16px' },
});

/** A page of one column: its heading, a line below it, and the rest. */
export function PageBody({
  heading,
  sub,
  children,
}: {
  heading: string;
  sub?: ReactNode;
  children: ReactNode;
}) {
  const styles = useStyles();
  return (
    <div className={styles.body}>
      <h1 className={styles.heading}>{heading}</h1>
      <p className={styles.sub}>{sub}</p>
      {children}
    </div>
  );
}

import { makeStyles, tokens } from '@fluentui/react-components';

const useStyles = makeStyles({
  card: {
    padding: '28px 24px',
    borderRadius: '10px',
    border: `1px solid ${tokens.colorNeutralStroke2}`,
    backgroundColor: tokens.colorNeutralBackground1,
  },
  heading: { fontSize: '16px', lineHeight: '24px', fontWeight: 700 },
  told: { color: tokens.colorNeutralForeground2, maxWidth: '60ch' },
});

export function NoStudies({ administrator }: { administrator: boolean }) {
  const styles = useStyles();
  return (
    <div className={styles.card}>
      <h2 className={styles.heading}>No studies yet</h2>
      <p className={styles.told}>
        {administrator
          ? 'An administrator looks after people and settings; what a study contains is open to its members alone.'
          : 'You are not a member of any study. The methodologist of a study can make you one, or you start one of your own.'}
      </p>
    </div>
  );
}

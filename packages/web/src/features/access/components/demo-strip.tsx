import { makeStyles, tokens } from '@fluentui/react-components';
import type { AccessView, PersonView } from '@steelyard/api/contract/access';
import { useMutation } from '@tanstack/react-query';
import { messageOf } from '../../../shared/api/faults';
import { Notice } from '../../../shared/ui/notice';
import { ownTokens } from '../../../shared/ui/own-tokens';
import { signIn } from '../api/access';

type Demo = NonNullable<AccessView['demo']>;

const useStyles = makeStyles({
  strip: {
    padding: '14px 16px 16px',
    borderRadius: '10px',
    border: `1px solid ${tokens.colorNeutralStroke2}`,
    backgroundColor: ownTokens.brassSoft,
  },
  heading: { fontSize: '14px', lineHeight: '20px', fontWeight: 700 },
  told: { fontSize: '13px', lineHeight: '18px', marginBottom: '10px' },
  fault: { marginBottom: '10px' },
  accounts: {
    display: 'grid',
    gridTemplateColumns: 'repeat(auto-fill, minmax(190px, 1fr))',
    gap: '6px',
  },
  account: {
    appearance: 'none',
    display: 'block',
    width: '100%',
    height: '100%',
    padding: '6px 10px',
    border: `1px solid ${tokens.colorNeutralStroke1}`,
    borderRadius: '6px',
    backgroundColor: tokens.colorNeutralBackground1,
    color: tokens.colorNeutralForeground1,
    font: 'inherit',
    lineHeight: '18px',
    textAlign: 'start',
    cursor: 'pointer',
    ':hover': { border: `1px solid ${tokens.colorNeutralForeground1}` },
    ':focus-visible': { outline: `2px solid ${tokens.colorStrokeFocus2}`, outlineOffset: '2px' },
  },
  name: { display: 'block', fontWeight: 700 },
  part: { display: 'block', color: tokens.colorNeutralForeground2, fontSize: '13px' },
});

interface DemoStripProps extends Demo {
  onSignedIn: (person: PersonView) => void;
}

/** In the demo: sign in as any of its people, without typing. */
export function DemoStrip({ accounts, password, onSignedIn }: DemoStripProps) {
  const styles = useStyles();
  const enter = useMutation({
    mutationFn: (email: string) => signIn({ email, password }),
    onSuccess: onSignedIn,
  });
  return (
    <section aria-labelledby="demo" className={styles.strip}>
      <h2 id="demo" className={styles.heading}>
        Demo: sign in as
      </h2>
      <p className={styles.told}>
        All people, organisations, studies and figures here are fictional. Password of each: {password}
      </p>
      {enter.isError && (
        <Notice intent="error" role="alert" className={styles.fault}>
          {messageOf(enter.error)}
        </Notice>
      )}
      <ul className={styles.accounts}>
        {accounts.map(({ name, email, part }) => (
          <li key={email}>
            <button type="button" className={styles.account} onClick={() => enter.mutate(email)}>
              <span className={styles.name}>{name}</span> <span className={styles.part}>{part}</span>
            </button>
          </li>
        ))}
      </ul>
    </section>
  );
}

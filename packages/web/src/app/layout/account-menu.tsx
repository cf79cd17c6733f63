import { makeStyles, tokens } from '@fluentui/react-components';
import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { Link, useNavigate } from 'react-router-dom';
import { sessionQuery, signOut } from '../../features/access/api/access';
import { messageOf } from '../../shared/api/faults';
import { type ThemeChoice, themeChoices, usePreferences } from '../../shared/preferences';
import { Disclosure } from '../../shared/ui/disclosure';
import { Initials } from '../../shared/ui/initials';
import { usePanelStyles } from '../../shared/ui/panel-item';
import { paths } from '../paths';

const useStyles = makeStyles({
  person: { padding: '4px 10px' },
  name: { fontWeight: 700 },
  email: { color: tokens.colorNeutralForeground2, fontSize: '13px', lineHeight: '18px' },
  fault: { padding: '4px 10px', fontSize: '13px', lineHeight: '18px', fontWeight: 700 },
  radio: { margin: 0, outlineStyle: 'none', accentColor: tokens.colorBrandForeground1 },
});

const themeNames: Record<ThemeChoice, string> = { system: 'As the device', light: 'Light', dark: 'Dark' };

/** Who is signed in, light or dark, and the way out. */
export function AccountMenu() {
  const styles = useStyles();
  const panel = usePanelStyles();
  const queryClient = useQueryClient();
  const navigate = useNavigate();
  const theme = usePreferences((preferences) => preferences.theme);
  const { data: person } = useQuery(sessionQuery());

  const leave = useMutation({
    mutationFn: signOut,
    onSuccess: () => {
      queryClient.clear();
      void navigate(paths.signIn);
    },
  });
  if (!person) return null;

  return (
    <Disclosure
      label={`Account: ${person.name}`}
      trigger={<Initials name={person.name} tone={0} />}
      align="end"
    >
      {(close) => (
        <>
          <div className={styles.person}>
            <div className={styles.name}>{person.name}</div>
            <div className={styles.email}>{person.email}</div>
          </div>
          <fieldset className={panel.group}>
            <legend className={panel.heading}>Appearance</legend>
            {themeChoices.map((choice) => (
              <label key={choice} className={panel.item}>
                <input
                  type="radio"
                  name="theme"
                  className={styles.radio}
                  checked={choice === theme}
                  onChange={() => usePreferences.setState({ theme: choice })}
                />
                {themeNames[choice]}
              </label>
            ))}
          </fieldset>
          <div className={panel.group}>
            <Link to={paths.profile} className={panel.item} onClick={close}>
              Profile
            </Link>
            {person.administrator && (
              <Link to={paths.admin} className={panel.item} onClick={close}>
                People
              </Link>
            )}
            <button type="button" className={panel.item} onClick={() => leave.mutate()}>
              Sign out
            </button>
            {leave.isError && (
              <p role="alert" className={styles.fault}>
                You are still signed in. {messageOf(leave.error)}
              </p>
            )}
          </div>
        </>
      )}
    </Disclosure>
  );
}

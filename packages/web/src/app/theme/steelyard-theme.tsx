import { FluentProvider, makeStyles, tokens } from '@fluentui/react-components';
import { type ReactNode, useEffect } from 'react';
import { usePreferences } from '../../shared/preferences';
import { useMedia } from '../../shared/ui/use-media';
import { darkTheme, lightTheme } from './theme';

const useStyles = makeStyles({
  ground: { minHeight: '100vh', backgroundColor: tokens.colorNeutralBackground2 },
});

/** The theme the person chose, else the surroundings'; paper is always light. */
export function SteelyardTheme({ children }: { children: ReactNode }) {
  const styles = useStyles();
  const choice = usePreferences((preferences) => preferences.theme);
  const surroundingsDark = useMedia('(prefers-color-scheme: dark)');
  const printing = useMedia('print');
  const dark = !printing && (choice === 'dark' || (choice === 'system' && surroundingsDark));

  useEffect(() => {
    document.documentElement.style.colorScheme = dark ? 'dark' : 'light';
  }, [dark]);

  return (
    <FluentProvider theme={dark ? darkTheme : lightTheme}>
      <div className={styles.ground}>{children}</div>
    </FluentProvider>
  );
}

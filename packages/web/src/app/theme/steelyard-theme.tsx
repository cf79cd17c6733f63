import { FluentProvider, makeStyles, tokens } from '@fluentui/react-components';
import { type ReactNode, useEffect, useState } from 'react';
import { usePreferences } from '../../shared/preferences';
import { MountContext } from '../../shared/ui/mount';
import { PaletteContext } from '../../shared/ui/palette';
import { useMedia } from '../../shared/ui/use-media';
import { darkPalette, lightPalette } from './palette';
import 'virtual:theme.css';

const useStyles = makeStyles({
  ground: { minHeight: '100vh', backgroundColor: tokens.colorNeutralBackground2 },
});

/** The values of all tokens come from the style sheet. */
const fromStyleSheet = {};

/** The theme the person chose, else the surroundings'; paper is always light. */
export function SteelyardTheme({ children }: { children: ReactNode }) {
  const styles = useStyles();
  const [ground, setGround] = useState<HTMLElement | null>(null);
  const choice = usePreferences((preferences) => preferences.theme);
  const surroundingsDark = useMedia('(prefers-color-scheme: dark)');
  const printing = useMedia('print');
  const dark = !printing && (choice === 'dark' || (choice === 'system' && surroundingsDark));

  useEffect(() => {
    document.documentElement.style.colorScheme = dark ? 'dark' : 'light';
  }, [dark]);

  return (
    <FluentProvider theme={fromStyleSheet} className={dark ? 'steelyard-dark' : 'steelyard-light'}>
      <PaletteContext value={dark ? darkPalette : lightPalette}>
        <MountContext value={ground}>
          <div ref={setGround} className={styles.ground}>
            {children}
          </div>
        </MountContext>
      </PaletteContext>
    </FluentProvider>
  );
}

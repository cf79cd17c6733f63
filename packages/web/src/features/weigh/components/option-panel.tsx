import { Button, makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import { ChevronDoubleLeftRegular, ChevronDoubleRightRegular } from '@fluentui/react-icons';
import type { ReactNode } from 'react';
import { usePreferences } from '../../../shared/preferences';
import { OptionTag } from '../../../shared/ui/option-tag';
import type { Weighed, Weighing } from '../model/weighing';
import { ToldAgainst } from './told-against';

const wide = '@media (min-width: 1280px)';

const useStyles = makeStyles({
  panel: {
    padding: '16px 18px 20px',
    borderTop: `1px solid ${tokens.colorNeutralStroke2}`,
    backgroundColor: tokens.colorNeutralBackground1,
    [wide]: {
      position: 'sticky',
      top: '48px',
      height: 'calc(100vh - 48px)',
      overflowY: 'auto',
      borderTop: 'none',
      borderLeft: `1px solid ${tokens.colorNeutralStroke2}`,
    },
    '@media print': { display: 'none' },
  },
  folded: { [wide]: { padding: '12px 6px', overflowY: 'hidden' } },
  head: { display: 'flex', alignItems: 'flex-start', gap: '10px', marginBottom: '12px' },
  headFolded: { marginBottom: 0, [wide]: { flexDirection: 'column-reverse', alignItems: 'center' } },
  name: {
    flexGrow: 1,
    minWidth: 0,
    fontSize: '16px',
    lineHeight: '24px',
    fontWeight: 700,
    overflowWrap: 'anywhere',
  },
  nameFolded: { [wide]: { writingMode: 'vertical-rl' } },
  fold: {
    minWidth: 0,
    flexShrink: 0,
    transform: 'rotate(90deg)',
    [wide]: { transform: 'none' },
  },
});

interface OptionPanelProps {
  option: Weighed;
  weighing: Weighing;
  /** What stands before the figures: the ruling. */
  ruling: ReactNode;
  /** All that is known of the option, to read or to edit. */
  details: ReactNode;
}

/** The chosen option beside the beams, or below them where there is less room; it folds away. */
export function OptionPanel({ option, weighing, ruling, details }: OptionPanelProps) {
  const styles = useStyles();
  const folded = usePreferences((preferences) => preferences.panelFolded);
  return (
    <section
      aria-label={`Option ${option.letter}`}
      className={mergeClasses(styles.panel, folded && styles.folded)}
    >
      <div className={mergeClasses(styles.head, folded && styles.headFolded)}>
        <OptionTag
          letter={option.letter}
          position={option.position}
          outlined={option.ruling?.kind === 'not-admissible'}
        />
        <h2 className={mergeClasses(styles.name, folded && styles.nameFolded)}>{option.name}</h2>
        <Button
          appearance="subtle"
          size="small"
          className={styles.fold}
          icon={folded ? <ChevronDoubleLeftRegular /> : <ChevronDoubleRightRegular />}
          aria-expanded={!folded}
          aria-label={folded ? 'Unfold the option' : 'Fold the option away'}
          onClick={() => usePreferences.setState({ panelFolded: !folded })}
        />
      </div>
      {!folded && (
        <>
          {ruling}
          <ToldAgainst option={option} weighing={weighing} />
          {details}
        </>
      )}
    </section>
  );
}

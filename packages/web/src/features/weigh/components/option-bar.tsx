import { makeStyles, tokens } from '@fluentui/react-components';
import type { ReactNode } from 'react';

const useStyles = makeStyles({
  bar: {
    position: 'sticky',
    bottom: 0,
    zIndex: 2,
    marginTop: '4px',
    padding: '10px 0 14px',
    // The panel that scrolls beside the beams is padded this far below.
    '@media (min-width: 1280px)': { bottom: '-20px' },
    // On a screen this low a bar that stays would leave no room for what it is about.
    '@media (max-height: 400px)': { position: 'static' },
    borderTop: `1px solid ${tokens.colorNeutralStroke2}`,
    backgroundColor: tokens.colorNeutralBackground1,
    display: 'flex',
    flexWrap: 'wrap',
    alignItems: 'center',
    gap: '8px',
    '@media print': { display: 'none' },
  },
  told: {
    flexBasis: '100%',
    color: tokens.colorNeutralForeground2,
    fontSize: '13px',
    lineHeight: '18px',
    // It takes no room while it has nothing to say, and is there to be heard when it has.
    ':empty': { marginBottom: '-8px' },
  },
  // Together and at the end, on a line of their own where there is no room beside the looks.
  acts: { display: 'flex', flexWrap: 'wrap', gap: '8px', marginInlineStart: 'auto' },
});

interface OptionBarProps {
  /** Where the option can be looked at from here. */
  looks: ReactNode;
  /** How its edits stand. */
  told?: ReactNode;
  /** What may be done with its edits. */
  children?: ReactNode;
}

/** The foot of an option's panel, always in sight. */
export function OptionBar({ looks, told, children }: OptionBarProps) {
  const styles = useStyles();
  return (
    <div className={styles.bar}>
      <span role="status" className={styles.told}>
        {told}
      </span>
      {looks}
      {children && <div className={styles.acts}>{children}</div>}
    </div>
  );
}

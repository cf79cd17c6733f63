import { makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import type { ReactNode } from 'react';
import { Tip } from './tip';

const useStyles = makeStyles({
  trigger: {
    appearance: 'none',
    display: 'inline',
    padding: 0,
    border: 'none',
    background: 'none',
    font: 'inherit',
    color: 'inherit',
    textAlign: 'inherit',
    cursor: 'help',
    borderRadius: tokens.borderRadiusSmall,
    ':focus-visible': { outline: `2px solid ${tokens.colorStrokeFocus2}`, outlineOffset: '2px' },
  },
});

interface HintProps {
  says: string;
  /** Whether what it says names the trigger or adds to its text. */
  relationship?: 'label' | 'description';
  className?: string;
  children: ReactNode;
}

/** Something that says more when it is pointed at, focused or pressed. */
export function Hint({ says, relationship = 'description', className, children }: HintProps) {
  const styles = useStyles();
  return (
    <Tip says={says} relationship={relationship} pressed>
      <button type="button" className={mergeClasses(styles.trigger, className)}>
        {children}
      </button>
    </Tip>
  );
}

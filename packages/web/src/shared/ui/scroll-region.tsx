import { makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import type { ReactNode } from 'react';

const useStyles = makeStyles({
  region: {
    overflowX: 'auto',
    ':focus-visible': { outline: `2px solid ${tokens.colorStrokeFocus2}`, outlineOffset: '-2px' },
  },
});

/** What may be wider than the screen: it scrolls sideways, by keyboard too. */
export function ScrollRegion(props: { label: string; className?: string; children: ReactNode }) {
  const styles = useStyles();
  return (
    <section
      aria-label={props.label}
      // biome-ignore lint/a11y/noNoninteractiveTabindex: what scrolls must be reachable to scroll it.
      tabIndex={0}
      className={mergeClasses(styles.region, props.className)}
    >
      {props.children}
    </section>
  );
}

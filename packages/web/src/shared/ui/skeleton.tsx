import { makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import type { ReactNode } from 'react';

const useStyles = makeStyles({
  item: {
    borderRadius: '4px',
    backgroundColor: tokens.colorNeutralStencil1,
    '@media (prefers-reduced-motion: no-preference)': {
      animationName: { from: { opacity: 1 }, '50%': { opacity: 0.5 }, to: { opacity: 1 } },
      animationDuration: '2s',
      animationIterationCount: 'infinite',
    },
  },
});

interface SkeletonProps {
  'aria-label': string;
  className?: string;
  children: ReactNode;
}

/** The shape of what is on its way. */
export function Skeleton(props: SkeletonProps) {
  return (
    <div role="progressbar" aria-busy="true" aria-label={props['aria-label']} className={props.className}>
      {props.children}
    </div>
  );
}

/** A part of it, so many pixels high. */
export function SkeletonItem({ size, className }: { size: number; className?: string }) {
  const styles = useStyles();
  return <div className={mergeClasses(styles.item, className)} style={{ height: `${size}px` }} />;
}

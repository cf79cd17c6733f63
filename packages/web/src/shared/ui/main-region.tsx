import { makeStyles, mergeClasses } from '@fluentui/react-components';
import { type ReactNode, useEffect, useRef } from 'react';
import { useLocation } from 'react-router-dom';

export const mainId = 'main';

const useStyles = makeStyles({ main: { minWidth: 0, outlineStyle: 'none' } });

/** The page's main landmark; it takes the focus when one page gives way to another. */
export function MainRegion({ className, children }: { className?: string; children: ReactNode }) {
  const styles = useStyles();
  const region = useRef<HTMLElement>(null);
  const { pathname, key } = useLocation();
  const arrived = useRef<string | undefined>(key === 'default' ? pathname : undefined);

  useEffect(() => {
    if (arrived.current !== pathname) region.current?.focus();
    arrived.current = pathname;
  }, [pathname]);

  return (
    <main id={mainId} ref={region} tabIndex={-1} className={mergeClasses(styles.main, className)}>
      {children}
    </main>
  );
}

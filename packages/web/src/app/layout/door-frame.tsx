import { makeStyles, tokens } from '@fluentui/react-components';
import type { ReactNode } from 'react';
import { Brand } from '../../shared/ui/brand';
import { MainRegion } from '../../shared/ui/main-region';
import { Notice } from '../../shared/ui/notice';
import { onBar, ownTokens } from '../../shared/ui/own-tokens';
import { Skeleton, SkeletonItem } from '../../shared/ui/skeleton';

const useStyles = makeStyles({
  bar: {
    display: 'flex',
    alignItems: 'center',
    height: '48px',
    paddingInline: '20px',
    backgroundColor: ownTokens.bar,
    color: onBar.text,
    '@media (max-width: 640px)': { paddingInline: '12px' },
  },
  body: {
    display: 'grid',
    gap: '20px',
    width: 'fit-content',
    minWidth: 'min(100%, 420px)',
    maxWidth: '100%',
    marginInline: 'auto',
    padding: '48px 20px',
    '@media (max-width: 640px)': { padding: '20px 12px 32px' },
  },
  columns: {
    display: 'grid',
    gridTemplateColumns: 'minmax(0, 440px)',
    alignItems: 'start',
    gap: '28px 48px',
    '@media (min-width: 960px)': {
      gridAutoFlow: 'column',
      gridTemplateColumns: '380px',
      gridAutoColumns: '460px',
    },
  },
  heading: { fontSize: '26px', lineHeight: '34px', fontWeight: 900 },
  sub: { color: tokens.colorNeutralForeground2 },
  skeleton: { display: 'grid', gap: '16px', width: '380px', maxWidth: '100%' },
});

/** The pages before one is in: the bar, a heading and what one may do. */
export function DoorFrame(props: { heading: string; notice?: string | undefined; children: ReactNode }) {
  const styles = useStyles();
  return (
    <>
      <header className={styles.bar}>
        <Brand />
      </header>
      <MainRegion>
        <div className={styles.body}>
          <div>
            <h1 className={styles.heading}>{props.heading}</h1>
            <p className={styles.sub}>
              Weigh candidate trial designs for one research question side by side.
            </p>
          </div>
          {props.notice && <Notice intent="info">{props.notice}</Notice>}
          {props.children}
        </div>
      </MainRegion>
    </>
  );
}

export function DoorSkeleton() {
  const styles = useStyles();
  return (
    <Skeleton aria-label="Loading" className={styles.skeleton}>
      <SkeletonItem size={32} />
      <SkeletonItem size={32} />
      <SkeletonItem size={32} />
    </Skeleton>
  );
}

/** What one may do, side by side where there is room. */
export function DoorColumns({ children }: { children: ReactNode }) {
  return <div className={useStyles().columns}>{children}</div>;
}

import { makeStyles } from '@fluentui/react-components';
import { Skeleton, SkeletonItem } from './skeleton';

const useStyles = makeStyles({ skeleton: { display: 'grid', gap: '16px', maxWidth: '640px' } });

/** Stands in for a form that is on its way. */
export function FormSkeleton({ label }: { label: string }) {
  const styles = useStyles();
  return (
    <Skeleton aria-label={label} className={styles.skeleton}>
      <SkeletonItem size={64} />
      <SkeletonItem size={32} />
      <SkeletonItem size={32} />
      <SkeletonItem size={32} />
    </Skeleton>
  );
}

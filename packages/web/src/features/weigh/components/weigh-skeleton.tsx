import { makeStyles } from '@fluentui/react-components';
import { Skeleton, SkeletonItem } from '../../../shared/ui/skeleton';

const useStyles = makeStyles({
  skeleton: { display: 'grid', gap: '12px', padding: '18px', maxWidth: '960px' },
  question: { width: '70%' },
  sub: { width: '45%' },
});

/** Where the question, the verdict and the beams will stand. */
export function WeighSkeleton() {
  const styles = useStyles();
  return (
    <Skeleton aria-label="Loading the study" className={styles.skeleton}>
      <SkeletonItem size={24} className={styles.question} />
      <SkeletonItem size={16} className={styles.sub} />
      <SkeletonItem size={56} />
      <SkeletonItem size={64} />
      <SkeletonItem size={64} />
      <SkeletonItem size={64} />
    </Skeleton>
  );
}

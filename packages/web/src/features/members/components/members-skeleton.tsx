import { makeStyles } from '@fluentui/react-components';
import { Skeleton, SkeletonItem } from '../../../shared/ui/skeleton';

const useStyles = makeStyles({ skeleton: { display: 'grid', gap: '10px' } });

export function MembersSkeleton() {
  const styles = useStyles();
  return (
    <Skeleton aria-label="Loading the members" className={styles.skeleton}>
      <SkeletonItem size={72} />
      <SkeletonItem size={72} />
    </Skeleton>
  );
}

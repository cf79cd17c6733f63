import { Button, makeStyles } from '@fluentui/react-components';
import { useMutation } from '@tanstack/react-query';
import { messageOf } from '../../../shared/api/faults';
import { Notice } from '../../../shared/ui/notice';
import { signOutEverywhere } from '../api/profile';

const useStyles = makeStyles({ body: { display: 'grid', gap: '14px' } });

export function SignOutEverywhere({ onSignedOut }: { onSignedOut: () => void }) {
  const styles = useStyles();
  const leave = useMutation({ mutationFn: signOutEverywhere, onSuccess: onSignedOut });
  return (
    <div className={styles.body}>
      <p>Ends your sessions in every browser and on every device, this one too. Sign in again to go on.</p>
      {leave.isError && (
        <Notice intent="error" role="alert">
          {messageOf(leave.error)}
        </Notice>
      )}
      <div>
        <Button disabledFocusable={leave.isPending} onClick={() => leave.mutate()}>
          Sign out everywhere
        </Button>
      </div>
    </div>
  );
}

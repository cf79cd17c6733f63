import { Button, makeStyles } from '@fluentui/react-components';
import type { AccountView, InvitationView } from '@steelyard/api/contract/people';
import { messageOf } from '../../../shared/api/faults';
import { DialogBox } from '../../../shared/ui/dialog-box';
import { Notice } from '../../../shared/ui/notice';
import { useNewLink } from '../api/people';

const useStyles = makeStyles({
  body: { display: 'grid', gap: '14px' },
  actions: { display: 'flex', flexWrap: 'wrap', gap: '8px' },
});

interface NewLinkProps {
  account: AccountView;
  onInvited: (invitation: InvitationView) => void;
  onClose: () => void;
}

/** Says what a new link does before it is made. */
export function NewLink({ account: { id, name }, onInvited, onClose }: NewLinkProps) {
  const styles = useStyles();
  const make = useNewLink();
  return (
    <DialogBox title={`A new link for ${name}?`} onClose={onClose}>
      {(close) => (
        <div className={styles.body}>
          {make.isError && (
            <Notice intent="error" role="alert">
              {messageOf(make.error)}
            </Notice>
          )}
          <p>
            With the link {name} chooses a new password. A link made before stops working. Whoever holds the
            new one can sign in as {name}: pass it on to nobody else.
          </p>
          <div className={styles.actions}>
            <Button
              appearance="primary"
              disabledFocusable={make.isPending}
              onClick={() =>
                make.mutate(id, {
                  onSuccess: (invitation) => {
                    close();
                    onInvited(invitation);
                  },
                })
              }
            >
              Make the link
            </Button>
            <Button onClick={close}>Cancel</Button>
          </div>
        </div>
      )}
    </DialogBox>
  );
}

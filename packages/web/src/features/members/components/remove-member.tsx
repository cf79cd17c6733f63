import { Button, makeStyles } from '@fluentui/react-components';
import { messageOf } from '../../../shared/api/faults';
import { DialogBox } from '../../../shared/ui/dialog-box';
import { Notice } from '../../../shared/ui/notice';
import { type Member, useRemoveMember } from '../api/members';

const useStyles = makeStyles({
  body: { display: 'grid', gap: '14px' },
  actions: { display: 'flex', flexWrap: 'wrap', gap: '8px' },
});

interface RemoveMemberProps {
  studyId: string;
  member: Member;
  self: boolean;
  onRemoved: (said: string) => void;
  onLeft: () => void;
  onClose: () => void;
}

/** Says what follows from removing a member before it is done. */
export function RemoveMember({ studyId, member, self, onRemoved, onLeft, onClose }: RemoveMemberProps) {
  const styles = useStyles();
  const remove = useRemoveMember(studyId);
  const { id, name } = member.person;

  return (
    <DialogBox title={self ? 'Leave this study?' : `Remove ${name} from this study?`} onClose={onClose}>
      {(close) => (
        <div className={styles.body}>
          {remove.isError && (
            <Notice intent="error" role="alert">
              {messageOf(remove.error)}
            </Notice>
          )}
          <p>
            {self
              ? 'You will not see this study any more; only another methodologist can add you again. What you did stays in its history under your name.'
              : `${name} will not see this study any more, from this moment on. What they did stays in its history under their name, and you can add them again at any time.`}
          </p>
          <div className={styles.actions}>
            <Button
              appearance="primary"
              disabledFocusable={remove.isPending}
              onClick={() =>
                remove.mutate(id, {
                  onSuccess: () => {
                    close();
                    onRemoved(`${name} is not a member any more.`);
                    if (self) onLeft();
                  },
                })
              }
            >
              {self ? 'Leave the study' : `Remove ${name}`}
            </Button>
            <Button onClick={close}>Cancel</Button>
          </div>
        </div>
      )}
    </DialogBox>
  );
}

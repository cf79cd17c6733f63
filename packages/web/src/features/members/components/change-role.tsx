import { Button, makeStyles } from '@fluentui/react-components';
import type { StudyRole } from '@steelyard/api/contract/studies';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { messageOf } from '../../../shared/api/faults';
import { DialogBox } from '../../../shared/ui/dialog-box';
import { Form } from '../../../shared/ui/form';
import { RadioField } from '../../../shared/ui/radio-field';
import { type Member, useSetMember } from '../api/members';
import { roleChoices } from '../model/roles';

const useStyles = makeStyles({ actions: { display: 'flex', flexWrap: 'wrap', gap: '8px' } });

interface ChangeRoleProps {
  studyId: string;
  member: Member;
  self: boolean;
  onChanged: (said: string) => void;
  onLeft: () => void;
  onClose: () => void;
}

export function ChangeRole({ studyId, member, self, onChanged, onLeft, onClose }: ChangeRoleProps) {
  const styles = useStyles();
  const [fault, setFault] = useState<string>();
  const change = useSetMember(studyId);
  const { name, email } = member.person;
  const { control, handleSubmit, watch, formState } = useForm<{ role: StudyRole }>({
    defaultValues: { role: member.role },
  });
  const givesUp = self && member.role === 'methodologist' && watch('role') !== 'methodologist';

  const submit = (close: () => void) =>
    handleSubmit(async ({ role }) => {
      setFault(undefined);
      await change.mutateAsync({ email, role }).then(
        () => {
          close();
          onChanged(`${name} is ${role} now.`);
          if (self && role === 'funder') onLeft();
        },
        (error) => setFault(messageOf(error)),
      );
    });

  return (
    <DialogBox title={`Role of ${name}`} onClose={onClose}>
      {(close) => (
        <Form label={`Role of ${name}`} fault={fault} onSubmit={() => void submit(close)()}>
          <RadioField label="Role" control={control} name="role" choices={roleChoices} />
          {givesUp && <p>You give up looking after the members; only a methodologist can give it back.</p>}
          <div className={styles.actions}>
            <Button type="submit" appearance="primary" disabledFocusable={formState.isSubmitting}>
              Save the role
            </Button>
            <Button onClick={close}>Cancel</Button>
          </div>
        </Form>
      )}
    </DialogBox>
  );
}

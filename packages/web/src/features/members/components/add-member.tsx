import { Button } from '@fluentui/react-components';
import { type NewMember, newMemberSchema } from '@steelyard/api/contract/members';
import { useMemo } from 'react';
import { Form, TextField } from '../../../shared/ui/form';
import { RadioField } from '../../../shared/ui/radio-field';
import { useKeptForm } from '../../unsaved/api/use-kept-form';
import { type Member, useSetMember } from '../api/members';
import { roleChoices } from '../model/roles';

interface AddMemberProps {
  studyId: string;
  members: readonly Member[];
  onAdded: (said: string) => void;
}

const nobody = (): NewMember => ({ email: '', role: 'reader' });

const newcomer = (members: readonly Member[]) =>
  newMemberSchema.refine(({ email }) => members.every(({ person }) => person.email !== email), {
    path: ['email'],
    message: 'This person is a member already; change their role in the list above.',
  });

export function AddMember({ studyId, members, onAdded }: AddMemberProps) {
  const add = useSetMember(studyId);
  const { form, fault, busy, submit } = useKeptForm({
    what: `${studyId}/new-member`,
    view: null,
    valuesOf: nobody,
    schema: useMemo(() => newcomer(members), [members]),
    bodyOf: (values) => values,
    send: (member: NewMember) => add.mutateAsync(member).then(() => member),
    onSaved: ({ email, role }) => onAdded(`Added ${email} as ${role}.`),
  });
  const { control } = form;

  return (
    <Form label="Add a member" fault={fault} onSubmit={() => void submit()}>
      <TextField
        label="E-mail"
        hint="Of somebody who has an account here; an administrator gives people accounts."
        type="email"
        autoComplete="off"
        control={control}
        name="email"
      />
      <RadioField label="Role" control={control} name="role" choices={roleChoices} />
      <div>
        <Button type="submit" appearance="primary" disabledFocusable={busy}>
          Add the member
        </Button>
      </div>
    </Form>
  );
}

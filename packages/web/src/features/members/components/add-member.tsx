import { Button } from '@fluentui/react-components';
import { zodResolver } from '@hookform/resolvers/zod';
import { type NewMember, newMemberSchema } from '@steelyard/api/contract/members';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { placeFaults } from '../../../shared/api/faults';
import { Form, TextField } from '../../../shared/ui/form';
import { RadioField } from '../../../shared/ui/radio-field';
import { dropValues, keptValues, useKeptValues } from '../../../shared/ui/use-kept-values';
import { type Member, useSetMember } from '../api/members';
import { roleChoices } from '../model/roles';

interface AddMemberProps {
  studyId: string;
  personId: string;
  members: readonly Member[];
  onAdded: (said: string) => void;
}

const nobody: NewMember = { email: '', role: 'reader' };

export function AddMember({ studyId, personId, members, onAdded }: AddMemberProps) {
  const [fault, setFault] = useState<string>();
  const add = useSetMember(studyId);
  const key = `steelyard-new-member/${personId}/${studyId}`;
  const form = useForm<NewMember>({
    resolver: zodResolver(newMemberSchema),
    defaultValues: keptValues(key) ?? nobody,
  });
  useKeptValues(form, key);
  const { control, handleSubmit, setError, reset, formState } = form;

  const submit = handleSubmit(async (values) => {
    setFault(undefined);
    if (members.some(({ person }) => person.email === values.email)) {
      const message = 'This person is a member already; change their role in the list above.';
      setError('email', { message }, { shouldFocus: true });
      return;
    }
    await add.mutateAsync(values).then(
      () => {
        reset(nobody);
        dropValues(key);
        onAdded(`Added ${values.email} as ${values.role}.`);
      },
      (error) => setFault(placeFaults(error, ['email'], setError)),
    );
  });

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
        <Button type="submit" appearance="primary" disabledFocusable={formState.isSubmitting}>
          Add the member
        </Button>
      </div>
    </Form>
  );
}

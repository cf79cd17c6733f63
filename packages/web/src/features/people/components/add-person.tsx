import { Button, Checkbox } from '@fluentui/react-components';
import { zodResolver } from '@hookform/resolvers/zod';
import { type InvitationView, newAccountSchema } from '@steelyard/api/contract/people';
import { useState } from 'react';
import { useController, useForm } from 'react-hook-form';
import { z } from 'zod';
import { placeFaults } from '../../../shared/api/faults';
import { Form, TextField } from '../../../shared/ui/form';
import { dropValues, keptValues, useKeptValues } from '../../../shared/ui/use-kept-values';
import { useInvite } from '../api/people';

const formSchema = newAccountSchema.extend({
  name: z.string().trim().min(1, 'Enter the person’s name.').max(200, 'A name has 200 characters or fewer.'),
  administrator: z.boolean(),
});

type NewPerson = z.infer<typeof formSchema>;

const nobody: NewPerson = { name: '', email: '', administrator: false };

interface AddPersonProps {
  /** Who adds somebody. */
  personId: string;
  onInvited: (invitation: InvitationView) => void;
}

export function AddPerson({ personId, onInvited }: AddPersonProps) {
  const [fault, setFault] = useState<string>();
  const invite = useInvite();
  const key = `steelyard-new-person/${personId}`;
  const form = useForm<NewPerson>({
    resolver: zodResolver(formSchema),
    defaultValues: keptValues(key) ?? nobody,
  });
  useKeptValues(form, key);
  const { control, handleSubmit, setError, reset, formState } = form;
  const { field: administrator } = useController({ control, name: 'administrator' });

  const submit = handleSubmit(async (account) => {
    setFault(undefined);
    await invite.mutateAsync(account).then(
      (invitation) => {
        reset(nobody);
        dropValues(key);
        onInvited(invitation);
      },
      (error) => setFault(placeFaults(error, ['name', 'email'], setError)),
    );
  });

  return (
    <Form label="Add a person" fault={fault} onSubmit={() => void submit()}>
      <TextField label="Name" autoComplete="off" control={control} name="name" />
      <TextField label="E-mail" type="email" autoComplete="off" control={control} name="email" />
      <Checkbox
        label="Administrator: looks after people, and never sees a study’s content"
        checked={administrator.value}
        onChange={(_, { checked }) => administrator.onChange(checked === true)}
        onBlur={administrator.onBlur}
      />
      <div>
        <Button type="submit" appearance="primary" disabledFocusable={formState.isSubmitting}>
          Add the person
        </Button>
      </div>
    </Form>
  );
}

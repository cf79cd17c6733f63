import { Button, Checkbox } from '@fluentui/react-components';
import { type InvitationView, newAccountSchema } from '@steelyard/api/contract/people';
import { useController } from 'react-hook-form';
import { z } from 'zod';
import { Form, TextField } from '../../../shared/ui/form';
import { useKeptForm } from '../../unsaved/api/use-kept-form';
import { useInvite } from '../api/people';

const formSchema = newAccountSchema.extend({
  name: z.string().trim().min(1, 'Enter the person’s name.').max(200, 'A name has 200 characters or fewer.'),
  administrator: z.boolean(),
});

type NewPerson = z.infer<typeof formSchema>;

const nobody = (): NewPerson => ({ name: '', email: '', administrator: false });

export function AddPerson({ onInvited }: { onInvited: (invitation: InvitationView) => void }) {
  const invite = useInvite();
  const { form, fault, busy, submit } = useKeptForm({
    what: 'new-person',
    view: null,
    valuesOf: nobody,
    schema: formSchema,
    bodyOf: (values) => values,
    send: (account: NewPerson) => invite.mutateAsync(account),
    onSaved: onInvited,
  });
  const { control } = form;
  const { field: administrator } = useController({ control, name: 'administrator' });

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
        <Button type="submit" appearance="primary" disabledFocusable={busy}>
          Add the person
        </Button>
      </div>
    </Form>
  );
}

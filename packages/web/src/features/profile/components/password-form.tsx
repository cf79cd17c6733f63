import { Button } from '@fluentui/react-components';
import { zodResolver } from '@hookform/resolvers/zod';
import { type ChangedPassword, changedPasswordSchema } from '@steelyard/api/contract/people';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { placeFaults } from '../../../shared/api/faults';
import { Form, TextField } from '../../../shared/ui/form';
import { useChangePassword } from '../api/profile';

export function PasswordForm({ email }: { email: string }) {
  const [fault, setFault] = useState<string>();
  const [said, setSaid] = useState('');
  const change = useChangePassword();
  const { control, handleSubmit, setError, reset, formState } = useForm<ChangedPassword>({
    resolver: zodResolver(changedPasswordSchema),
    defaultValues: { current: '', next: '' },
  });

  const submit = handleSubmit(async (passwords) => {
    setFault(undefined);
    setSaid('');
    await change.mutateAsync(passwords).then(
      () => {
        reset();
        setSaid('Your password is changed, and every other session of yours has ended.');
      },
      (error) => setFault(placeFaults(error, ['current', 'next'], setError)),
    );
  });

  return (
    <Form label="Your password" fault={fault} onSubmit={() => void submit()}>
      <input type="hidden" autoComplete="username" value={email} readOnly />
      <TextField
        label="Current password"
        type="password"
        autoComplete="current-password"
        control={control}
        name="current"
      />
      <TextField
        label="New password"
        hint="12 characters or more; a sentence is easiest to remember."
        type="password"
        autoComplete="new-password"
        control={control}
        name="next"
      />
      <div>
        <Button type="submit" disabledFocusable={formState.isSubmitting}>
          Change the password
        </Button>
      </div>
      <p role="status">{said}</p>
    </Form>
  );
}

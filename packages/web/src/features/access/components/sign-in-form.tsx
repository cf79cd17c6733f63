import { Button } from '@fluentui/react-components';
import { zodResolver } from '@hookform/resolvers/zod';
import { type PersonView, type SignIn, signInSchema } from '@steelyard/api/contract/access';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { placeFaults } from '../../../shared/api/faults';
import { Form, TextField } from '../../../shared/ui/form';
import { signIn } from '../api/access';

export function SignInForm({ onSignedIn }: { onSignedIn: (person: PersonView) => void }) {
  const [fault, setFault] = useState<string>();
  const { control, handleSubmit, setError, formState } = useForm<SignIn>({
    resolver: zodResolver(signInSchema),
    defaultValues: { email: '', password: '' },
  });

  const submit = handleSubmit(async (values) => {
    setFault(undefined);
    await signIn(values).then(onSignedIn, (error) =>
      setFault(placeFaults(error, ['email', 'password'], setError)),
    );
  });

  return (
    <Form label="Sign in" fault={fault} onSubmit={() => void submit()}>
      <TextField label="E-mail" type="email" autoComplete="username" control={control} name="email" />
      <TextField
        label="Password"
        type="password"
        autoComplete="current-password"
        control={control}
        name="password"
      />
      <div>
        <Button type="submit" appearance="primary" disabledFocusable={formState.isSubmitting}>
          Sign in
        </Button>
      </div>
    </Form>
  );
}

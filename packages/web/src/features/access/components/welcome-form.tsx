import { Button, makeStyles } from '@fluentui/react-components';
import { zodResolver } from '@hookform/resolvers/zod';
import type { PersonView } from '@steelyard/api/contract/access';
import { type WelcomeView, welcomePasswordSchema } from '@steelyard/api/contract/people';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { placeFaults } from '../../../shared/api/faults';
import { Form, TextField } from '../../../shared/ui/form';
import { enterByLink } from '../api/welcome';

const useStyles = makeStyles({ told: { marginBottom: '14px', overflowWrap: 'anywhere' } });

interface WelcomeFormProps {
  token: string;
  invited: WelcomeView;
  onEntered: (person: PersonView) => void;
}

/** Somebody whom an administrator gave a link chooses the password of their account. */
export function WelcomeForm({ token, invited, onEntered }: WelcomeFormProps) {
  const styles = useStyles();
  const [fault, setFault] = useState<string>();
  const { control, handleSubmit, setError, formState } = useForm<{ password: string }>({
    resolver: zodResolver(welcomePasswordSchema),
    defaultValues: { password: '' },
  });

  const submit = handleSubmit(async (values) => {
    setFault(undefined);
    await enterByLink(token, values).then(onEntered, (error) =>
      setFault(placeFaults(error, ['password'], setError)),
    );
  });

  return (
    <div>
      <p className={styles.told}>
        <strong>{invited.name}</strong>
        <br />
        {invited.email}
      </p>
      <p className={styles.told}>This account is yours. Choose a password, and you are in.</p>
      <Form label="Your account" fault={fault} onSubmit={() => void submit()}>
        <input type="hidden" autoComplete="username" value={invited.email} readOnly />
        <TextField
          label="Password"
          hint="12 characters or more; a sentence is easiest to remember."
          type="password"
          autoComplete="new-password"
          control={control}
          name="password"
        />
        <div>
          <Button type="submit" appearance="primary" disabledFocusable={formState.isSubmitting}>
            Set the password and sign in
          </Button>
        </div>
      </Form>
    </div>
  );
}

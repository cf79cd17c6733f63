import { Button, makeStyles } from '@fluentui/react-components';
import { zodResolver } from '@hookform/resolvers/zod';
import { type FirstVisit, firstVisitSchema, type PersonView } from '@steelyard/api/contract/access';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { placeFaults } from '../../../shared/api/faults';
import { Form, TextField } from '../../../shared/ui/form';
import { createAdministrator } from '../api/access';

const useStyles = makeStyles({ told: { marginBottom: '18px' } });

interface AdministratorFormProps {
  code: string;
  onCreated: (person: PersonView) => void;
}

/** The first account of an installation. */
export function AdministratorForm({ code, onCreated }: AdministratorFormProps) {
  const [fault, setFault] = useState<string>();
  const styles = useStyles();
  const { control, handleSubmit, setError, formState } = useForm<FirstVisit>({
    resolver: zodResolver(firstVisitSchema),
    defaultValues: { code, name: '', email: '', password: '' },
  });

  const submit = handleSubmit(async (values) => {
    setFault(undefined);
    await createAdministrator(values).then(onCreated, (error) =>
      setFault(placeFaults(error, ['code', 'name', 'email', 'password'], setError)),
    );
  });

  return (
    <div>
      <p className={styles.told}>
        You are creating the first account of this installation. It becomes its administrator, who looks after
        people and settings.
      </p>
      <Form label="Create the administrator" fault={fault} onSubmit={() => void submit()}>
        <TextField label="Name" autoComplete="name" control={control} name="name" />
        <TextField label="E-mail" type="email" autoComplete="username" control={control} name="email" />
        <TextField
          label="Password"
          hint="12 characters or more; a sentence is easiest to remember."
          type="password"
          autoComplete="new-password"
          control={control}
          name="password"
        />
        <TextField
          label="Code from the server’s console"
          autoComplete="one-time-code"
          control={control}
          name="code"
        />
        <div>
          <Button type="submit" appearance="primary" disabledFocusable={formState.isSubmitting}>
            Create the administrator
          </Button>
        </div>
      </Form>
    </div>
  );
}

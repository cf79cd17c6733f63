import { Button } from '@fluentui/react-components';
import { zodResolver } from '@hookform/resolvers/zod';
import { changedProfileSchema } from '@steelyard/api/contract/people';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { placeFaults } from '../../../shared/api/faults';
import { Form, TextField } from '../../../shared/ui/form';
import { dropValues, keptValues, useKeptValues } from '../../../shared/ui/use-kept-values';
import { currentIn, profileQuery, useSaveProfile } from '../api/profile';

export function NameForm() {
  const [fault, setFault] = useState<string>();
  const [said, setSaid] = useState('');
  const { data: profile } = useSuspenseQuery(profileQuery());
  const save = useSaveProfile();
  const key = `steelyard-name/${profile.id}`;
  const form = useForm<{ name: string }>({
    resolver: zodResolver(changedProfileSchema.pick({ name: true })),
    defaultValues: keptValues(key) ?? { name: profile.name },
  });
  useKeptValues(form, key);
  const { control, handleSubmit, setError, reset, formState } = form;

  const submit = handleSubmit(async ({ name }) => {
    setFault(undefined);
    setSaid('');
    await save.mutateAsync({ version: profile.version, name }).then(
      (saved) => {
        reset({ name: saved.name });
        dropValues(key);
        setSaid('Your name is saved.');
      },
      (error) => {
        const theirs = currentIn(error);
        setFault(
          theirs
            ? `Your profile was changed elsewhere in the meantime; the name there is “${theirs.name}”. Save again to make it “${name}”.`
            : placeFaults(error, ['name'], setError),
        );
      },
    );
  });

  return (
    <Form label="Your name" fault={fault} onSubmit={() => void submit()}>
      <TextField
        label="Name"
        hint="As the members of your studies see it."
        autoComplete="name"
        control={control}
        name="name"
      />
      <div>
        <Button type="submit" appearance="primary" disabledFocusable={formState.isSubmitting}>
          Save the name
        </Button>
      </div>
      <p role="status">{said}</p>
    </Form>
  );
}

import { Button } from '@fluentui/react-components';
import { changedProfileSchema } from '@steelyard/api/contract/people';
import { useQueryClient, useSuspenseQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Form, TextField } from '../../../shared/ui/form';
import { useKeptForm } from '../../unsaved/api/use-kept-form';
import { BothVersions } from '../../unsaved/components/both-versions';
import { differencesOf } from '../../unsaved/model/differences';
import { keepProfile, profileQuery, putProfile } from '../api/profile';

interface NameValues {
  name: string;
}

const bodyOf = ({ name }: NameValues, version: number | null) => ({ name, version });

export function NameForm() {
  const [said, setSaid] = useState('');
  const queryClient = useQueryClient();
  const { data: profile } = useSuspenseQuery(profileQuery());
  const { form, values, fault, busy, theirs, submit, takeTheirs, keepMine } = useKeptForm({
    what: 'name',
    view: profile,
    valuesOf: (view): NameValues => ({ name: (view ?? profile).name }),
    schema: changedProfileSchema,
    bodyOf,
    send: putProfile,
    onStored: (view) => view && keepProfile(queryClient, view),
    onSaved: () => setSaid('Your name is saved.'),
  });

  return (
    <Form
      label="Your name"
      fault={fault}
      onSubmit={() => {
        setSaid('');
        void submit();
      }}
    >
      {theirs?.view && (
        <BothVersions
          differences={differencesOf(values, { name: theirs.view.name }, () => 'Name')}
          by="Another session of yours"
          at={null}
          onKeepMine={keepMine}
          onTakeTheirs={takeTheirs}
        />
      )}
      <TextField
        label="Name"
        hint="As the members of your studies see it."
        autoComplete="name"
        control={form.control}
        name="name"
      />
      <div>
        <Button type="submit" appearance="primary" disabledFocusable={busy}>
          Save the name
        </Button>
      </div>
      <p role="status">{said}</p>
    </Form>
  );
}

import { makeStyles, tokens } from '@fluentui/react-components';
import type { AccountView, InvitationView } from '@steelyard/api/contract/people';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { TitledSection } from '../../../shared/ui/titled-section';
import { peopleQuery } from '../api/people';
import { AddPerson } from './add-person';
import { NewLink } from './new-link';
import { OneTimeLink } from './one-time-link';
import { PersonRow } from './person-row';

const useStyles = makeStyles({
  sections: { display: 'grid', gap: '24px', marginBottom: '28px' },
  list: { display: 'grid', gap: '10px' },
  add: { maxWidth: '440px' },
  told: { color: tokens.colorNeutralForeground2, marginBottom: '10px' },
});

/** Everybody with an account, and a way in for those without. */
export function People() {
  const styles = useStyles();
  const { data: people } = useSuspenseQuery(peopleQuery());
  const [asked, setAsked] = useState<AccountView>();
  const [invitation, setInvitation] = useState<InvitationView>();
  return (
    <div className={styles.sections}>
      <ul aria-label="People" className={styles.list}>
        {people.map((account, index) => (
          <PersonRow key={account.id} account={account} tone={index} onNewLink={() => setAsked(account)} />
        ))}
      </ul>
      <TitledSection title="Add a person" level={2}>
        <p className={styles.told}>
          You get a link to pass on; with it the person chooses a password. What they may see is up to the
          methodologists of the studies.
        </p>
        <div className={styles.add}>
          <AddPerson onInvited={setInvitation} />
        </div>
      </TitledSection>
      {asked && <NewLink account={asked} onInvited={setInvitation} onClose={() => setAsked(undefined)} />}
      {invitation && <OneTimeLink invitation={invitation} onClose={() => setInvitation(undefined)} />}
    </div>
  );
}

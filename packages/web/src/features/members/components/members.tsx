import { makeStyles, tokens } from '@fluentui/react-components';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { TitledSection } from '../../../shared/ui/titled-section';
import { type Member, membersQuery } from '../api/members';
import { AddMember } from './add-member';
import { ChangeRole } from './change-role';
import { MemberRow } from './member-row';
import { RemoveMember } from './remove-member';

const useStyles = makeStyles({
  list: { display: 'grid', gap: '10px', marginBottom: '24px' },
  note: { color: tokens.colorNeutralForeground2, marginBottom: '24px' },
  add: { maxWidth: '560px' },
});

interface MembersProps {
  studyId: string;
  personId: string;
  /** Only a methodologist says who the members are. */
  mayChange: boolean;
  /** The person has taken the study away from themselves. */
  onLeft: () => void;
}

export function Members({ studyId, personId, mayChange, onLeft }: MembersProps) {
  const styles = useStyles();
  const { data: members } = useSuspenseQuery(membersQuery(studyId));
  const [asked, setAsked] = useState<{ to: 'change' | 'remove'; member: Member }>();
  const [said, setSaid] = useState('');
  const close = () => setAsked(undefined);

  return (
    <>
      <ul aria-label="Members" className={styles.list}>
        {members.map((member, index) => (
          <MemberRow
            key={member.person.id}
            member={member}
            tone={index}
            self={member.person.id === personId}
            {...(mayChange && {
              onChange: () => setAsked({ to: 'change', member }),
              onRemove: () => setAsked({ to: 'remove', member }),
            })}
          />
        ))}
      </ul>
      <p role="status">{said}</p>
      {mayChange ? (
        <TitledSection title="Add a member" level={2}>
          <div className={styles.add}>
            <AddMember studyId={studyId} members={members} onAdded={setSaid} />
          </div>
        </TitledSection>
      ) : (
        <p className={styles.note}>A methodologist of the study adds and removes members.</p>
      )}
      {asked?.to === 'change' && (
        <ChangeRole
          studyId={studyId}
          member={asked.member}
          self={asked.member.person.id === personId}
          onChanged={setSaid}
          onLeft={onLeft}
          onClose={close}
        />
      )}
      {asked?.to === 'remove' && (
        <RemoveMember
          studyId={studyId}
          member={asked.member}
          self={asked.member.person.id === personId}
          onRemoved={setSaid}
          onLeft={onLeft}
          onClose={close}
        />
      )}
    </>
  );
}

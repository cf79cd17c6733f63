import { Button } from '@fluentui/react-components';
import { Chip } from '../../../shared/ui/chip';
import { PersonLine } from '../../../shared/ui/person-line';
import type { Member } from '../api/members';
import { roleMeanings, roleName } from '../model/roles';

interface MemberRowProps {
  member: Member;
  tone: number;
  self: boolean;
  onChange?: () => void;
  onRemove?: () => void;
}

export function MemberRow({ member: { person, role }, tone, self, onChange, onRemove }: MemberRowProps) {
  return (
    <PersonLine
      name={person.name}
      tone={tone}
      mark={
        <>
          {self && '(you)'} <Chip>{roleName(role)}</Chip>
        </>
      }
      notes={[person.email, roleMeanings[role]]}
    >
      {onChange && onRemove && (
        <>
          <Button aria-label={`Change the role of ${person.name}`} onClick={onChange}>
            Change role
          </Button>
          <Button aria-label={`Remove ${person.name}`} onClick={onRemove}>
            Remove
          </Button>
        </>
      )}
    </PersonLine>
  );
}

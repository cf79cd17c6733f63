import { Button, makeStyles, tokens } from '@fluentui/react-components';
import { Chip } from '../../../shared/ui/chip';
import { Initials } from '../../../shared/ui/initials';
import type { Member } from '../api/members';
import { roleMeanings, roleName } from '../model/roles';

const useStyles = makeStyles({
  row: {
    display: 'grid',
    gridTemplateColumns: 'auto minmax(0, 1fr) auto',
    alignItems: 'center',
    gap: '4px 14px',
    padding: '12px 16px',
    borderRadius: '10px',
    border: `1px solid ${tokens.colorNeutralStroke2}`,
    backgroundColor: tokens.colorNeutralBackground1,
    overflowWrap: 'anywhere',
    '@media (max-width: 640px)': { gridTemplateColumns: 'auto minmax(0, 1fr)', padding: '10px 12px' },
  },
  name: { display: 'flex', flexWrap: 'wrap', alignItems: 'center', gap: '2px 10px', fontWeight: 700 },
  small: { color: tokens.colorNeutralForeground2, fontSize: '13px', lineHeight: '18px' },
  actions: {
    display: 'flex',
    flexWrap: 'wrap',
    gap: '8px',
    '@media (max-width: 640px)': { gridColumn: '2' },
    '@media print': { display: 'none' },
  },
});

interface MemberRowProps {
  member: Member;
  tone: number;
  self: boolean;
  onChange?: () => void;
  onRemove?: () => void;
}

export function MemberRow({ member: { person, role }, tone, self, onChange, onRemove }: MemberRowProps) {
  const styles = useStyles();
  return (
    <li className={styles.row}>
      <Initials name={person.name} tone={tone} />
      <div>
        <p className={styles.name}>
          {person.name}
          {self && ' (you)'} <Chip>{roleName(role)}</Chip>
        </p>
        <p className={styles.small}>{person.email}</p>
        <p className={styles.small}>{roleMeanings[role]}</p>
      </div>
      {onChange && onRemove && (
        <div className={styles.actions}>
          <Button aria-label={`Change the role of ${person.name}`} onClick={onChange}>
            Change role
          </Button>
          <Button aria-label={`Remove ${person.name}`} onClick={onRemove}>
            Remove
          </Button>
        </div>
      )}
    </li>
  );
}

import { Button, makeStyles, tokens } from '@fluentui/react-components';
import type { AccountView } from '@steelyard/api/contract/people';
import { fullDate } from '../../../shared/format/times';
import { Chip } from '../../../shared/ui/chip';
import { Initials } from '../../../shared/ui/initials';

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
  action: { '@media (max-width: 640px)': { gridColumn: '2' }, '@media print': { display: 'none' } },
});

interface PersonRowProps {
  account: AccountView;
  tone: number;
  onNewLink: () => void;
}

export function PersonRow({ account, tone, onNewLink }: PersonRowProps) {
  const styles = useStyles();
  const { name, email, administrator, linkExpiresAt } = account;
  return (
    <li className={styles.row}>
      <Initials name={name} tone={tone} />
      <div>
        <p className={styles.name}>
          {name} {administrator && <Chip>Administrator</Chip>}
        </p>
        <p className={styles.small}>{email}</p>
        {linkExpiresAt && (
          <p className={styles.small}>
            Has a link that was not used yet; it works until {fullDate(linkExpiresAt)}.
          </p>
        )}
      </div>
      <div className={styles.action}>
        <Button aria-label={`New link for ${name}`} onClick={onNewLink}>
          New link
        </Button>
      </div>
    </li>
  );
}

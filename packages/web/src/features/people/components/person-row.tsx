import { Button } from '@fluentui/react-components';
import type { AccountView } from '@steelyard/api/contract/people';
import { fullDate } from '../../../shared/format/times';
import { Chip } from '../../../shared/ui/chip';
import { PersonLine } from '../../../shared/ui/person-line';

interface PersonRowProps {
  account: AccountView;
  tone: number;
  onNewLink: () => void;
}

export function PersonRow({ account, tone, onNewLink }: PersonRowProps) {
  const { name, email, administrator, linkExpiresAt } = account;
  const link =
    linkExpiresAt && `Has a link that was not used yet; it works until ${fullDate(linkExpiresAt)}.`;
  return (
    <PersonLine
      name={name}
      tone={tone}
      mark={administrator && <Chip>Administrator</Chip>}
      notes={link ? [email, link] : [email]}
    >
      <Button aria-label={`New link for ${name}`} onClick={onNewLink}>
        New link
      </Button>
    </PersonLine>
  );
}

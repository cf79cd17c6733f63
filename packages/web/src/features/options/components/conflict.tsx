import { Button, makeStyles } from '@fluentui/react-components';
import type { AuditView } from '@steelyard/api/contract/audit';
import type { OptionView } from '@steelyard/api/contract/design-sets';
import { useQuery } from '@tanstack/react-query';
import { api } from '../../../shared/api/client';
import { fullDate } from '../../../shared/format/times';
import { DataTable } from '../../../shared/ui/data-table';
import { Notice } from '../../../shared/ui/notice';
import type { KeptDraft } from '../../designs/model/drafts';
import { differences } from '../../designs/model/option-draft';

const useStyles = makeStyles({ bar: { marginBottom: '12px' }, table: { marginTop: '6px' } });

interface ConflictProps {
  studyId: string;
  draft: KeptDraft;
  stored: OptionView;
  onKeepMine: () => void;
  onTakeTheirs: () => void;
}

/** Someone else stored another version while this one was edited: both side by side, and the person chooses. */
export function Conflict({ studyId, draft, stored, onKeepMine, onTakeTheirs }: ConflictProps) {
  const styles = useStyles();
  const { data } = useQuery({
    queryKey: ['studies', studyId, 'history', 'latest', stored.id, stored.version],
    queryFn: ({ signal }) => api.get<AuditView>(`/studies/${studyId}/history?limit=50`, signal),
  });
  const change = data?.entries.find(
    ({ action, what }) =>
      action === 'changed' && (what.includes(`“${stored.name}”`) || what.includes(`“${draft.base.name}”`)),
  );
  const rows = differences(draft, stored);
  return (
    <Notice
      intent="warning"
      className={styles.bar}
      role="alert"
      actions={
        <>
          <Button onClick={onKeepMine}>Keep mine</Button>
          <Button onClick={onTakeTheirs}>Take theirs</Button>
        </>
      }
    >
      <strong>{change?.by ?? 'Someone else'}</strong> stored another version
      {change && ` on ${fullDate(change.at)}`} while you were editing. Yours is kept here.
      <div className={styles.table}>
        <DataTable
          label="Both versions"
          columns={[{ label: 'What differs' }, { label: 'Yours' }, { label: 'Theirs' }]}
          rows={rows.map(({ label, mine, theirs }) => ({ key: label, cells: [label, mine, theirs] }))}
        />
      </div>
    </Notice>
  );
}

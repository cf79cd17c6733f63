import { Button, makeStyles } from '@fluentui/react-components';
import { useQuery } from '@tanstack/react-query';
import { fullDate } from '../../../shared/format/times';
import { DataTable } from '../../../shared/ui/data-table';
import { Notice } from '../../../shared/ui/notice';
import { lastChangeQuery } from '../api/last-change';
import type { Difference } from '../model/differences';

const useStyles = makeStyles({
  body: { display: 'grid', gap: '10px', paddingBlock: '8px', overflowWrap: 'anywhere' },
  actions: { display: 'flex', flexWrap: 'wrap', gap: '8px' },
});

interface BothVersionsProps {
  differences: readonly Difference[];
  by: string | null;
  at: string | null;
  onKeepMine: () => void;
  onTakeTheirs: () => void;
}

/** Somebody else saved first: both versions side by side, for the person to choose. */
export function BothVersions({ differences, by, at, onKeepMine, onTakeTheirs }: BothVersionsProps) {
  const styles = useStyles();
  return (
    <Notice intent="warning" role="alert">
      <div className={styles.body}>
        <p>
          <strong>{by ?? 'Somebody else'} saved first</strong>
          {at && `, ${fullDate(at)}`}. Nothing of yours is lost: choose which version to go on with.
        </p>
        {differences.length > 0 ? (
          <DataTable
            label="Your version and theirs"
            columns={[{ label: 'What' }, { label: 'Yours' }, { label: 'Theirs' }]}
            rows={differences.map(({ label, mine, theirs }) => ({
              key: label,
              cells: [label, mine, theirs],
            }))}
          />
        ) : (
          <p>Both say the same.</p>
        )}
        <div className={styles.actions}>
          <Button onClick={onKeepMine}>Go on with mine</Button>
          <Button onClick={onTakeTheirs}>Take theirs</Button>
        </div>
      </div>
    </Notice>
  );
}

type LastChangeProps = Omit<BothVersionsProps, 'by' | 'at'> & { studyId: string; what: string };

/** As above, for what does not itself say who changed it: the study’s history does. */
export function BothVersionsByHistory({ studyId, what, ...rest }: LastChangeProps) {
  const { data } = useQuery(lastChangeQuery(studyId, what));
  return <BothVersions {...rest} by={data?.by ?? null} at={data?.at ?? null} />;
}

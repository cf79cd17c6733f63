import { Button, makeStyles, tokens } from '@fluentui/react-components';
import { useSuspenseInfiniteQuery } from '@tanstack/react-query';
import { messageOf } from '../../../shared/api/faults';
import { Notice } from '../../../shared/ui/notice';
import type { HistoryQuery } from '../api/history';
import { HistoryEntry } from './history-entry';

const useStyles = makeStyles({
  entries: { display: 'grid', gap: '10px', marginBottom: '14px' },
  fault: { marginBottom: '10px' },
  end: { color: tokens.colorNeutralForeground2, fontSize: '13px', lineHeight: '18px' },
});

interface HistoryProps {
  query: HistoryQuery;
  label: string;
  /** What to say while nothing has happened. */
  empty: string;
  /** What the study’s treatments are called, by place. */
  treatments?: readonly string[];
}

/** Who did what and when, newest first, page by page. */
export function History({ query, label, empty, treatments = [] }: HistoryProps) {
  const styles = useStyles();
  const { data, hasNextPage, fetchNextPage, isFetchingNextPage, isFetchNextPageError, error } =
    useSuspenseInfiniteQuery(query);
  const entries = data.pages.flatMap((page) => page.entries);
  if (entries.length === 0) return <p>{empty}</p>;
  return (
    <>
      <ol aria-label={label} className={styles.entries}>
        {entries.map((entry) => (
          <HistoryEntry key={entry.id} entry={entry} treatments={treatments} />
        ))}
      </ol>
      {isFetchNextPageError && (
        <Notice intent="error" role="alert" className={styles.fault}>
          What came before could not be shown. {messageOf(error)}
        </Notice>
      )}
      {hasNextPage ? (
        <Button disabledFocusable={isFetchingNextPage} onClick={() => void fetchNextPage()}>
          Show what came before
        </Button>
      ) : (
        <p className={styles.end}>This is where the record begins.</p>
      )}
    </>
  );
}

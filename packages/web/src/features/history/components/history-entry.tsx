import { makeStyles, tokens } from '@fluentui/react-components';
import type { AuditAction, AuditEntryView } from '@steelyard/api/contract/audit';
import { counted } from '../../../shared/format/lists';
import { DataTable } from '../../../shared/ui/data-table';
import { Moment } from '../../../shared/ui/moment';
import { type ChangedFact, changedFacts } from '../model/changed-facts';

const useStyles = makeStyles({
  entry: {
    padding: '12px 16px',
    borderRadius: '10px',
    border: `1px solid ${tokens.colorNeutralStroke2}`,
    backgroundColor: tokens.colorNeutralBackground1,
    overflowWrap: 'anywhere',
    breakInside: 'avoid',
    '@media (max-width: 640px)': { padding: '10px 12px' },
  },
  head: { display: 'flex', flexWrap: 'wrap', justifyContent: 'space-between', columnGap: '20px' },
  deed: { flex: '1 1 260px' },
  by: { fontWeight: 700 },
  when: { color: tokens.colorNeutralForeground2, fontSize: '13px', lineHeight: '20px' },
  facts: { marginTop: '6px', '> summary': { cursor: 'pointer', fontSize: '13px', lineHeight: '20px' } },
  text: { whiteSpace: 'pre-wrap' },
});

/** Actions that need more than their own word to be understood. */
const phrases: Partial<Record<AuditAction, string>> = {
  invited: 'made a one-time link for',
  welcomed: 'came in by the one-time link for',
};

const deed = ({ action, what }: AuditEntryView) => `${phrases[action] ?? action} ${what}`;

/** More facts than these wait until they are asked for. */
const atOnce = 6;

interface HistoryEntryProps {
  entry: AuditEntryView;
  treatments: readonly string[];
}

/** One thing somebody did, with every fact it changed. */
export function HistoryEntry({ entry, treatments }: HistoryEntryProps) {
  const styles = useStyles();
  const facts = changedFacts(entry, treatments);
  const table = <Facts of={entry} facts={facts} />;
  return (
    <li className={styles.entry}>
      <div className={styles.head}>
        <p className={styles.deed}>
          <span className={styles.by}>{entry.by ?? 'The server'}</span> {deed(entry)}
        </p>
        <p className={styles.when}>
          <Moment iso={entry.at} />
        </p>
      </div>
      {facts.length > atOnce ? (
        <details className={styles.facts}>
          <summary>{counted(facts.length, 'fact', 'facts')}</summary>
          {table}
        </details>
      ) : (
        facts.length > 0 && <div className={styles.facts}>{table}</div>
      )}
    </li>
  );
}

function Facts({ of, facts }: { of: AuditEntryView; facts: readonly ChangedFact[] }) {
  const styles = useStyles();
  const sides = [
    ...(of.before ? [{ label: 'Before', side: 'before' as const }] : []),
    ...(of.after ? [{ label: of.before ? 'After' : 'Value', side: 'after' as const }] : []),
  ];
  return (
    <DataTable
      even
      label={deed(of)}
      columns={[{ label: 'Fact' }, ...sides]}
      rows={facts.map((fact) => ({
        key: fact.path,
        cells: [
          fact.name,
          ...sides.map(({ side }) => (
            <span key={side} className={styles.text}>
              {fact[side]}
            </span>
          )),
        ],
      }))}
    />
  );
}

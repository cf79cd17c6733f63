import { makeStyles, tokens } from '@fluentui/react-components';
import type { ReactNode } from 'react';
import { Initials } from './initials';

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
  note: { color: tokens.colorNeutralForeground2, fontSize: '13px', lineHeight: '18px' },
  actions: {
    display: 'flex',
    flexWrap: 'wrap',
    gap: '8px',
    '@media (max-width: 640px)': { gridColumn: '2' },
    '@media print': { display: 'none' },
  },
});

interface PersonLineProps {
  name: string;
  tone: number;
  /** Stands behind the name. */
  mark: ReactNode;
  notes: readonly string[];
  /** What may be done about the person. */
  children: ReactNode;
}

/** A person in a list: name, what is to be known of them, what may be done. */
export function PersonLine({ name, tone, mark, notes, children }: PersonLineProps) {
  const styles = useStyles();
  return (
    <li className={styles.row}>
      <Initials name={name} tone={tone} />
      <div>
        <p className={styles.name}>
          {name} {mark}
        </p>
        {notes.map((note) => (
          <p key={note} className={styles.note}>
            {note}
          </p>
        ))}
      </div>
      {children && <div className={styles.actions}>{children}</div>}
    </li>
  );
}

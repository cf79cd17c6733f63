import { makeStyles, tokens } from '@fluentui/react-components';
import type { StudySummary } from '@steelyard/api/contract/studies';
import { capitalised, counted } from '../../../shared/format/lists';
import { Chip } from '../../../shared/ui/chip';
import { Moment } from '../../../shared/ui/moment';
import { Skeleton, SkeletonItem } from '../../../shared/ui/skeleton';
import { TextLink } from '../../../shared/ui/text-link';

const useStyles = makeStyles({
  list: { display: 'grid', gap: '10px' },
  card: {
    position: 'relative',
    display: 'grid',
    gridTemplateColumns: 'minmax(0, 1fr) auto',
    columnGap: '20px',
    padding: '14px 18px',
    borderRadius: '10px',
    border: `1px solid ${tokens.colorNeutralStroke2}`,
    backgroundColor: tokens.colorNeutralBackground1,
    overflowWrap: 'anywhere',
    '@media (max-width: 640px)': {
      gridTemplateColumns: 'minmax(0, 1fr)',
      padding: '12px 14px',
      rowGap: '8px',
    },
  },
  open: { ':hover': { border: `1px solid ${tokens.colorNeutralStroke1}` } },
  name: { fontSize: '16px', lineHeight: '24px', fontWeight: 700 },
  link: { '::after': { content: '""', position: 'absolute', inset: 0, borderRadius: '10px' } },
  organisation: { color: tokens.colorNeutralForeground2, fontSize: '13px', lineHeight: '18px' },
  question: { marginTop: '6px', maxWidth: '72ch' },
  facts: {
    display: 'flex',
    flexDirection: 'column',
    alignItems: 'flex-end',
    gap: '6px',
    fontSize: '13px',
    lineHeight: '18px',
    color: tokens.colorNeutralForeground2,
    '@media (max-width: 640px)': {
      flexDirection: 'row',
      alignItems: 'center',
      flexWrap: 'wrap',
      columnGap: '12px',
    },
  },
  marks: { display: 'flex', flexWrap: 'wrap', gap: '6px' },
  waiting: { marginTop: '6px', fontSize: '13px', lineHeight: '18px', fontWeight: 700 },
  choice: { color: tokens.colorNeutralForeground1, overflowWrap: 'anywhere' },
  skeleton: { display: 'grid', gap: '10px' },
});

interface StudyListProps {
  studies: StudySummary[];
  hrefOf: (study: StudySummary) => string;
}

export function StudyList({ studies, hrefOf }: StudyListProps) {
  const styles = useStyles();
  return (
    <ul className={styles.list} aria-label="Studies">
      {studies.map((study) => (
        <li key={study.id} className={styles.card}>
          <div>
            <h2 className={styles.name}>
              {study.mayOpen ? (
                <TextLink to={hrefOf(study)} className={styles.link}>
                  {study.name}
                </TextLink>
              ) : (
                study.name
              )}
            </h2>
            <p className={styles.organisation}>{study.organisation}</p>
            <p className={styles.question}>{study.question}</p>
            {!study.mayOpen && (
              <p className={styles.waiting}>
                Nothing has been submitted to you yet; the draft is the team’s own.
              </p>
            )}
          </div>
          <div className={styles.facts}>
            <div className={styles.marks}>
              {study.fictional && <Chip>Fictional</Chip>}
              <Chip>{capitalised(study.role)}</Chip>
            </div>
            <span>{counted(study.options, 'option', 'options')}</span>
            {study.choice && (
              <strong className={styles.choice}>
                Chosen: {study.choice.letter}, {study.choice.name}
              </strong>
            )}
            <span>
              changed <Moment iso={study.changedAt} />
            </span>
          </div>
        </li>
      ))}
    </ul>
  );
}

export function StudyListSkeleton() {
  const styles = useStyles();
  return (
    <Skeleton aria-label="Loading the studies" className={styles.skeleton}>
      <SkeletonItem size={96} />
      <SkeletonItem size={96} />
      <SkeletonItem size={96} />
    </Skeleton>
  );
}

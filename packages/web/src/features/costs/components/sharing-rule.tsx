import { makeStyles, tokens } from '@fluentui/react-components';
import type { StudyView } from '@steelyard/api/contract/studies';
import { list } from '../../../shared/format/lists';

const useStyles = makeStyles({
  rule: {
    display: 'grid',
    gap: '6px',
    maxWidth: '72ch',
    marginBottom: '14px',
    padding: '12px 16px',
    border: `1px solid ${tokens.colorNeutralStroke2}`,
    borderRadius: '10px',
    backgroundColor: tokens.colorNeutralBackground1,
    overflowWrap: 'anywhere',
  },
  heading: { fontSize: '15px', lineHeight: '22px', fontWeight: 700 },
});

/** How cost that no arm causes by itself is laid to the arms. */
export function SharingRule({ study: { participants, clusters } }: { study: StudyView }) {
  const styles = useStyles();
  const shared = list([
    'the fixed cost',
    'the months',
    `recruiting ${participants.many}`,
    ...(clusters ? [`each ${clusters.one}`] : []),
  ]);
  return (
    <section aria-label="How cost is shared" className={styles.rule}>
      <h2 className={styles.heading}>What an arm costs</h2>
      <p>An arm bears what it causes itself: its treatments, its measurements and what an arm costs once.</p>
      <p>
        What all arms share ({shared}) is split between them in proportion to their exposures, that is, to how
        many {participants.many} are given each treatment: an arm with twice the exposures bears twice the
        share. In a crossover each of the {participants.many} counts once for every treatment taken. Overhead
        comes on top of both. The arms together always come to the total.
      </p>
    </section>
  );
}

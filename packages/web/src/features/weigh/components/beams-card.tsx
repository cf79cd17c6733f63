import { Button, makeStyles, tokens } from '@fluentui/react-components';
import { useState } from 'react';
import { Word } from '../../../shared/ui/words';
import { referenceOf } from '../model/against';
import { measuresOf } from '../model/beam-measures';
import { beamScale, beamsFinding, beamsLegend } from '../model/beams';
import type { Weighing } from '../model/weighing';
import { AgainstBar } from './against-bar';
import { Beams } from './beams';
import { BeamsTable } from './beams-table';
import { useWeighView } from './use-weigh-view';

const useStyles = makeStyles({
  card: {
    border: `1px solid ${tokens.colorNeutralStroke2}`,
    borderRadius: '10px',
    backgroundColor: tokens.colorNeutralBackground1,
    overflow: 'hidden',
    '@media print': { breakInside: 'avoid' },
  },
  table: { padding: '10px 14px' },
  foot: {
    display: 'flex',
    flexWrap: 'wrap',
    alignItems: 'center',
    justifyContent: 'space-between',
    gap: '6px 16px',
    padding: '8px 14px',
    borderTop: `1px solid ${tokens.colorNeutralStroke2}`,
    color: tokens.colorNeutralForeground2,
    fontSize: '13px',
    lineHeight: '18px',
  },
  words: { flex: '1 1 240px', minWidth: 0 },
  finding: { color: tokens.colorNeutralForeground1 },
  toggle: { fontWeight: 400, '@media print': { display: 'none' } },
});

interface BeamsCardProps {
  weighing: Weighing;
  selected: string | undefined;
  onSelect: (optionId: string) => void;
}

/** The options' beams, or the same figures as a table. */
export function BeamsCard({ weighing, selected, onSelect }: BeamsCardProps) {
  const styles = useStyles();
  const { view, show } = useWeighView();
  const [asTable, setAsTable] = useState(false);
  const measures = measuresOf(weighing);
  const measure = measures.find(({ key }) => key === view.beams) ?? measures[0];
  const scale = beamScale(weighing, measure);
  const reference = referenceOf(weighing, view.against);
  return (
    <section aria-label="Options side by side" className={styles.card}>
      <AgainstBar reference={reference} onBack={() => show({ against: undefined })} />
      {asTable ? (
        <div className={styles.table}>
          <BeamsTable weighing={weighing} reference={reference} />
        </div>
      ) : (
        <Beams
          weighing={weighing}
          measures={measures}
          measure={measure}
          scale={scale}
          reference={reference}
          selected={selected}
          onSelect={onSelect}
        />
      )}
      <div className={styles.foot}>
        <p className={styles.words}>
          <span className={styles.finding}>{beamsFinding(weighing, measure)}</span>{' '}
          <Word is="beam">Beams</Word> run from 0 to {measure.show(scale)}. {beamsLegend(weighing, measure)}.
        </p>
        <Button
          size="small"
          shape="circular"
          className={styles.toggle}
          aria-pressed={asTable}
          onClick={() => setAsTable(!asTable)}
        >
          Table
        </Button>
      </div>
    </section>
  );
}

import { Button, makeStyles, tokens } from '@fluentui/react-components';
import type { PlanningValueView, StudyView } from '@steelyard/api/contract/studies';
import { letterOf } from '@steelyard/calc';
import { type ReactNode, useEffect, useRef, useState } from 'react';
import { list } from '../../../shared/format/lists';
import { Chip } from '../../../shared/ui/chip';
import { Moment } from '../../../shared/ui/moment';
import { toReplace } from '../../studies/model/assumed';
import { figureOf, type Line, rangeOf } from '../model/lines';
import { RangeFigure } from './range-figure';
import { ValueHistory } from './value-history';

const useStyles = makeStyles({
  card: {
    display: 'grid',
    gridTemplateColumns: 'minmax(0, 1fr)',
    gap: '6px',
    padding: '10px 16px 12px',
    border: `1px solid ${tokens.colorNeutralStroke2}`,
    borderRadius: '10px',
    backgroundColor: tokens.colorNeutralBackground1,
    overflowWrap: 'anywhere',
  },
  head: { display: 'flex', flexWrap: 'wrap', alignItems: 'center', gap: '4px 12px' },
  name: { flexGrow: 1, outlineStyle: 'none', fontSize: '15px', lineHeight: '22px', fontWeight: 700 },
  value: { fontSize: '17px', lineHeight: '24px', fontWeight: 700 },
  foot: { display: 'flex', flexWrap: 'wrap', alignItems: 'center', gap: '8px 16px' },
  facts: {
    display: 'flex',
    flexWrap: 'wrap',
    flex: '1 1 min(280px, 100%)',
    alignItems: 'center',
    gap: '2px 20px',
  },
  range: { display: 'flex', flexWrap: 'wrap', alignItems: 'center', gap: '4px 10px' },
  muted: { color: tokens.colorNeutralForeground2, fontSize: '13px', lineHeight: '18px' },
  actions: { display: 'flex', flexWrap: 'wrap', gap: '8px' },
});

interface LedgerLineProps {
  study: StudyView;
  line: Line;
  /** The line’s form where it is being set, or how to begin; nothing for those who may not. */
  form: ReactNode;
  actions: ReactNode;
  outcome: ReactNode;
}

/** One planning value: its figures, source, author and history. */
export function LedgerLine({ study, line, form, actions, outcome }: LedgerLineProps) {
  const styles = useStyles();
  const [historyOpen, setHistoryOpen] = useState(false);
  const { show } = figureOf(line.key, study);
  const { stored } = line;
  const heading = useRef<HTMLHeadingElement>(null);
  const setting = form !== null;
  const wasSetting = useRef(setting);
  useEffect(() => {
    // With the form goes the button that had the focus.
    if (wasSetting.current && !setting && document.activeElement === document.body) heading.current?.focus();
    wasSetting.current = setting;
  }, [setting]);

  return (
    <li className={styles.card}>
      <div className={styles.head}>
        <h2 ref={heading} tabIndex={-1} className={styles.name}>
          {line.label}
        </h2>
        {line.assumed && <Chip>{toReplace}</Chip>}
        <span className={styles.value}>{stored ? show(stored.value) : 'not stated'}</span>
        {!stored && actions}
      </div>
      {stored && <p>{stored.source}</p>}
      <div className={styles.foot}>
        <div className={styles.facts}>
          {stored && <Provenance stored={stored} show={show} />}
          <p className={styles.muted}>{drawnOn(line)}</p>
        </div>
        {stored && (
          <div className={styles.actions}>
            {actions}
            <Button
              aria-label={`History of ${line.label}`}
              aria-expanded={historyOpen}
              onClick={() => setHistoryOpen(!historyOpen)}
            >
              History
            </Button>
          </div>
        )}
      </div>
      {outcome}
      {form}
      {stored && historyOpen && <ValueHistory studyId={study.id} line={{ ...line, stored }} show={show} />}
    </li>
  );
}

function Provenance({ stored, show }: { stored: PlanningValueView; show: (value: number) => string }) {
  const styles = useStyles();
  const { value, low, high } = stored;
  return (
    <>
      <div className={styles.range}>
        {low !== null && high !== null && <RangeFigure value={value} low={low} high={high} />}
        <span className={styles.muted}>{rangeOf(stored, show) ?? 'No range stated'}</span>
      </div>
      <p className={styles.muted}>
        Set by {stored.setBy}, <Moment iso={stored.setAt} />
      </p>
    </>
  );
}

function drawnOn({ drawnOnBy, stored }: Line): string {
  const letters = list(drawnOnBy.map(letterOf));
  if (!letters) return 'No option draws on it.';
  return stored ? `Drawn on by ${letters}.` : `${letters} would draw on it.`;
}

import { makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import type { Feasible } from '@steelyard/calc';
import type { ReactNode } from 'react';
import { exactMoney, money } from '../../../shared/format/money';
import { count, months, power } from '../../../shared/format/numbers';
import { Tip } from '../../../shared/ui/tip';
import { differenceFrom } from '../model/against';
import type { Measure } from '../model/beam-measures';
import { beamOf, totalOf } from '../model/beams';
import type { Weighed, Weighing } from '../model/weighing';
import { Beam } from './beam';
import { narrow, useCellStyles } from './row-styles';
import { StandingCell } from './standing-cell';

const useStyles = makeStyles({
  beam: { [narrow]: { gridColumn: '1 / 5', gridRow: 2 } },
  caption: {
    display: 'block',
    color: tokens.colorNeutralForeground2,
    fontSize: '13px',
    lineHeight: '17px',
  },
  figure: {
    fontSize: '16px',
    lineHeight: '20px',
    fontWeight: 700,
    textAlign: 'end',
    whiteSpace: 'nowrap',
    [narrow]: { fontSize: '15px', gridRow: 4, textAlign: 'start' },
  },
  exact: { position: 'relative', zIndex: 1 },
  difference: {
    display: 'block',
    color: tokens.colorBrandForeground1,
    fontSize: '13px',
    lineHeight: '16px',
    fontWeight: 400,
  },
  unit: {
    display: 'none',
    [narrow]: {
      display: 'inline',
      fontSize: '13px',
      fontWeight: 400,
      color: tokens.colorNeutralForeground2,
    },
  },
  standing: { paddingLeft: '16px', [narrow]: { paddingLeft: 0, gridColumn: '1 / 5', gridRow: 3 } },
});

interface BeamFiguresProps {
  size: Feasible;
  option: Weighed;
  weighing: Weighing;
  measure: Measure;
  scale: number;
  reference: Weighed | undefined;
  hue: string;
}

/** The beam, the figures and the standing of an option that has a size; with a reference, the differences too. */
export function BeamFigures(props: BeamFiguresProps) {
  const styles = useStyles();
  const { cell } = useCellStyles();
  const { size, option, weighing, measure, scale, reference, hue } = props;
  const { currency } = weighing;
  const { costs, timeline } = size;
  const beam = beamOf(option, weighing, measure, scale);
  const compact = (amount: number) => money(amount, currency);
  const difference =
    reference && reference.id !== option.id ? differenceFrom(option, reference, compact) : undefined;
  return (
    <>
      <td className={mergeClasses(cell, styles.beam)}>
        {beam ? <Beam beam={beam} hue={hue} /> : <span className={styles.caption}>{measure.absent}</span>}
        {beam && measure.totalled && (
          <span className={styles.caption}>{measure.show(totalOf(option, measure))}</span>
        )}
      </td>
      <Figure
        shown={power(size.power)}
        unit="power"
        difference={difference && `${difference.power} points`}
      />
      <Figure
        shown={costs && money(costs.total, currency)}
        exact={costs && exactMoney(costs.total, currency)}
        difference={difference?.cost}
      />
      <Figure
        shown={timeline && count(timeline.months)}
        exact={timeline && `${months(timeline.months)} months`}
        unit="months"
        difference={difference?.months}
      />
      <td className={mergeClasses(cell, styles.standing)}>
        <StandingCell option={option} weighing={weighing} reference={reference} difference={difference} />
      </td>
    </>
  );
}

interface FigureProps {
  shown: string | undefined;
  exact?: string | undefined;
  unit?: string;
  difference: ReactNode;
}

function Figure({ shown = '–', exact, unit, difference }: FigureProps) {
  const styles = useStyles();
  const { cell } = useCellStyles();
  return (
    <td className={mergeClasses(cell, styles.figure)}>
      {exact ? (
        <Tip says={exact}>
          <span className={styles.exact}>{shown}</span>
        </Tip>
      ) : (
        shown
      )}
      {unit && <span className={styles.unit}> {unit}</span>}
      {difference && <span className={styles.difference}>{difference}</span>}
    </td>
  );
}

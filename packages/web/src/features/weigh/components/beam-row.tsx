import { makeStyles, mergeClasses, Tooltip, tokens } from '@fluentui/react-components';
import type { Feasible } from '@steelyard/calc';
import { exactMoney, money } from '../../../shared/format/money';
import { count, months, power } from '../../../shared/format/numbers';
import { OptionTag } from '../../../shared/ui/option-tag';
import { optionHue, ownTokens } from '../../../shared/ui/own-tokens';
import { Schedule } from '../../designs/components/schedule';
import { familyUiOf } from '../../designs/families/registry';
import { beamOf } from '../model/beams';
import type { Weighed, Weighing } from '../model/weighing';
import { Beam } from './beam';
import { OutOfReach } from './out-of-reach';
import { StandingCell } from './standing-cell';

const narrow = '@media (max-width: 640px)';

const useStyles = makeStyles({
  row: {
    position: 'relative',
    borderTop: `1px solid ${tokens.colorNeutralStroke2}`,
    ':hover': { backgroundColor: ownTokens.hovered },
    [narrow]: {
      display: 'grid',
      gridTemplateColumns: 'auto auto 1fr auto',
      columnGap: '18px',
      rowGap: '4px',
      padding: '10px 12px',
      alignItems: 'baseline',
    },
  },
  selected: {
    backgroundColor: ownTokens.chosen,
    boxShadow: `inset 3px 0 ${tokens.colorBrandForeground1}`,
    ':hover': { backgroundColor: ownTokens.chosen },
  },
  cell: {
    height: '54px',
    padding: '7px 6px',
    minWidth: 0,
    ':first-child': { paddingLeft: '14px' },
    ':last-child': { paddingRight: '14px' },
    [narrow]: {
      height: 'auto',
      padding: 0,
      ':first-child': { paddingLeft: 0 },
      ':last-child': { paddingRight: 0 },
    },
  },
  option: { textAlign: 'start', fontWeight: 400, [narrow]: { gridColumn: '1 / 4', gridRow: 1 } },
  choice: {
    appearance: 'none',
    display: 'flex',
    alignItems: 'center',
    gap: '10px',
    width: '100%',
    padding: 0,
    border: 'none',
    background: 'none',
    font: 'inherit',
    color: 'inherit',
    textAlign: 'start',
    cursor: 'pointer',
    outlineStyle: 'none',
    '::after': { content: '""', position: 'absolute', inset: 0 },
    ':focus-visible::after': { outline: `2px solid ${tokens.colorStrokeFocus2}`, outlineOffset: '-2px' },
  },
  name: { display: 'block', fontWeight: 700, lineHeight: '18px', overflowWrap: 'anywhere' },
  summary: {
    display: 'block',
    fontSize: '13px',
    lineHeight: '17px',
    color: tokens.colorNeutralForeground2,
    overflowWrap: 'anywhere',
  },
  schedule: { textAlign: 'center', [narrow]: { gridColumn: 4, gridRow: 1 } },
  cost: { [narrow]: { gridColumn: '1 / 5', gridRow: 2 } },
  figure: {
    fontSize: '16px',
    lineHeight: '22px',
    fontWeight: 700,
    textAlign: 'end',
    whiteSpace: 'nowrap',
    [narrow]: { fontSize: '15px', gridRow: 3, textAlign: 'start' },
  },
  standing: { paddingLeft: '16px', [narrow]: { paddingLeft: 0, gridColumn: '1 / 5', gridRow: 4 } },
  exact: { position: 'relative', zIndex: 1 },
  unit: {
    display: 'none',
    [narrow]: {
      display: 'inline',
      fontSize: '13px',
      fontWeight: 400,
      color: tokens.colorNeutralForeground2,
    },
  },
});

interface BeamRowProps {
  option: Weighed;
  scale: number;
  weighing: Weighing;
  selected: boolean;
  onSelect: () => void;
}

/** One option: its button reaches over the whole row. */
export function BeamRow({ option, scale, weighing, selected, onSelect }: BeamRowProps) {
  const styles = useStyles();
  const { family, plan, words, appraisal, position, letter, name, ruling, draft } = option;
  const ruledOut = ruling?.kind === 'not-admissible';
  const hue = optionHue(position);
  const face = familyUiOf(family);
  const size = appraisal?.feasible ? appraisal : null;
  return (
    <tr className={mergeClasses(styles.row, selected && styles.selected)}>
      <th scope="row" className={mergeClasses(styles.cell, styles.option)}>
        <button type="button" aria-pressed={selected} className={styles.choice} onClick={onSelect}>
          <OptionTag letter={letter} position={position} outlined={ruledOut} />
          <span>
            <span className={styles.name}>{name}</span>{' '}
            <span className={styles.summary}>{face.summary(plan, size, words)}</span>
            {ruledOut && <span className={styles.summary}>Not admissible: {ruling.reason}</span>}
            {draft && <span className={styles.summary}>Edits not saved</span>}
          </span>
        </button>
      </th>
      <td className={mergeClasses(styles.cell, styles.schedule)}>
        <Schedule
          schematic={face.schematic(plan, words)}
          arms={words.arms}
          hue={hue}
          width={62}
          height={34}
        />
      </td>
      {size ? (
        <Figures size={size} option={option} scale={scale} weighing={weighing} hue={hue} />
      ) : (
        <td colSpan={5} className={mergeClasses(styles.cell, styles.cost)}>
          <OutOfReach option={option} />
        </td>
      )}
    </tr>
  );
}

interface FiguresProps {
  size: Feasible;
  option: Weighed;
  scale: number;
  weighing: Weighing;
  hue: string;
}

function Figures({ size, option, scale, weighing, hue }: FiguresProps) {
  const styles = useStyles();
  const { currency, limits } = weighing;
  const most = limits.limits.money;
  const { costs, timeline } = size;
  const figure = mergeClasses(styles.cell, styles.figure);
  return (
    <>
      <td className={mergeClasses(styles.cell, styles.cost)}>
        {costs && (
          <Beam
            parts={beamOf(option, scale)}
            hue={hue}
            currency={currency}
            limit={most === undefined ? undefined : { amount: most, at: most / scale }}
          />
        )}
      </td>
      <td className={figure}>
        {power(size.power)} <span className={styles.unit}>power</span>
      </td>
      <td className={figure}>
        {costs ? (
          <Tooltip content={exactMoney(costs.total, currency)} relationship="description" withArrow>
            <span className={styles.exact}>{money(costs.total, currency)}</span>
          </Tooltip>
        ) : (
          '–'
        )}
      </td>
      <td className={figure}>
        {timeline ? (
          <Tooltip content={`${months(timeline.months)} months`} relationship="description" withArrow>
            <span className={styles.exact}>{count(timeline.months)}</span>
          </Tooltip>
        ) : (
          '–'
        )}{' '}
        <span className={styles.unit}>months</span>
      </td>
      <td className={mergeClasses(styles.cell, styles.standing)}>
        <StandingCell option={option} weighing={weighing} />
      </td>
    </>
  );
}

import { makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import { OptionTag } from '../../../shared/ui/option-tag';
import { optionHue, ownTokens } from '../../../shared/ui/own-tokens';
import { Schedule } from '../../designs/components/schedule';
import { familyUiOf } from '../../designs/families/registry';
import { sizeOf } from '../model/against';
import type { Measure } from '../model/beam-measures';
import type { Weighed, Weighing } from '../model/weighing';
import { BeamFigures } from './beam-figures';
import { OutOfReach } from './out-of-reach';
import { narrow, useCellStyles } from './row-styles';

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
    // Which option somebody was at is nothing to print.
    '@media print': { backgroundColor: 'transparent', boxShadow: 'none' },
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
  reach: { [narrow]: { gridColumn: '1 / 5', gridRow: 2 } },
  // The panel has the reason in full.
  reason: {
    display: '-webkit-box',
    WebkitBoxOrient: 'vertical',
    WebkitLineClamp: '2',
    overflow: 'hidden',
    [narrow]: { display: 'block' },
    '@media print': { display: 'block' },
  },
  schedule: { textAlign: 'center', [narrow]: { gridColumn: 4, gridRow: 1 } },
});

interface BeamRowProps {
  option: Weighed;
  weighing: Weighing;
  measure: Measure;
  scale: number;
  /** The option that the others are told against. */
  reference: Weighed | undefined;
  selected: boolean;
  onSelect: () => void;
}

/** One option: its button reaches over the whole row. */
export function BeamRow({ option, selected, onSelect, ...shown }: BeamRowProps) {
  const styles = useStyles();
  const { cell } = useCellStyles();
  const { family, plan, words, position, letter, name, ruling, draft } = option;
  const ruledOut = ruling?.kind === 'not-admissible';
  const hue = optionHue(position);
  const face = familyUiOf(family);
  const size = sizeOf(option);
  return (
    <tr className={mergeClasses(styles.row, selected && styles.selected)}>
      <th scope="row" className={mergeClasses(cell, styles.option)}>
        <button type="button" aria-pressed={selected} className={styles.choice} onClick={onSelect}>
          <OptionTag letter={letter} position={position} outlined={ruledOut} />
          <span>
            <span className={styles.name}>{name}</span>{' '}
            <span className={styles.summary}>{face.summary(plan, size ?? null, words)}</span>
            {ruledOut && (
              <span className={mergeClasses(styles.summary, styles.reason)}>
                Not admissible: {ruling.reason}
              </span>
            )}
            {draft && <span className={styles.summary}>Edits not saved</span>}
          </span>
        </button>
      </th>
      <td className={mergeClasses(cell, styles.schedule)}>
        <Schedule
          schematic={face.schematic(plan, words)}
          arms={words.arms}
          hue={hue}
          width={62}
          height={34}
        />
      </td>
      {size ? (
        <BeamFigures size={size} option={option} hue={hue} {...shown} />
      ) : (
        <td colSpan={5} className={mergeClasses(cell, styles.reach)}>
          <OutOfReach option={option} />
        </td>
      )}
    </tr>
  );
}

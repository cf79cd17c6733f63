import { makeStyles, tokens } from '@fluentui/react-components';
import { useId } from 'react';
import { DataTable } from '../../../shared/ui/data-table';
import { Tip } from '../../../shared/ui/tip';
import type { Fill, PartsTable } from '../model/beam-measures';
import { type Beam as BeamModel, partsInWords } from '../model/beams';

const useStyles = makeStyles({
  trigger: {
    appearance: 'none',
    position: 'relative',
    zIndex: 1,
    display: 'block',
    width: '100%',
    padding: '1px 0',
    border: 'none',
    background: 'none',
    borderRadius: '4px',
    cursor: 'help',
    ':focus-visible': { outline: `2px solid ${tokens.colorStrokeFocus2}`, outlineOffset: '2px' },
  },
  beam: { display: 'block', width: '100%', height: '26px', overflow: 'visible', printColorAdjust: 'exact' },
});

/** An option's beam; it shows its parts when it is pointed at, focused or pressed. */
export function Beam({ beam, hue }: { beam: BeamModel; hue: string }) {
  const styles = useStyles();
  const told = useId();
  const { says, table } = beam;
  return (
    <Tip relationship="inaccessible" below pressed says={<Parts table={table} />}>
      <button type="button" aria-label={says} aria-describedby={told} className={styles.trigger}>
        <Bar beam={beam} hue={hue} />
        <span id={told} hidden>
          {partsInWords(table)}
        </span>
      </button>
    </Tip>
  );
}

function Parts({ table: { columns, rows } }: { table: PartsTable }) {
  return (
    <DataTable
      label={`Parts by ${columns[0]?.toLocaleLowerCase('en-GB')}`}
      totalled
      columns={columns.map((label, index) => ({ label, figures: index > 0 }))}
      rows={rows.map((cells) => ({ key: cells[0] ?? '', cells }))}
    />
  );
}

const percent = (share: number) => `${100 * share}%`;

function Bar({ beam: { parts, limitAt }, hue }: { beam: BeamModel; hue: string }) {
  const styles = useStyles();
  const stripes = useId();
  const fills: Record<Fill, string> = {
    outlined: tokens.colorNeutralBackground1,
    filled: hue,
    striped: `url(#${stripes})`,
  };
  return (
    <svg className={styles.beam} aria-hidden="true">
      <defs>
        <pattern
          id={stripes}
          width="6"
          height="6"
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(45)"
        >
          <rect width="6" height="6" fill={tokens.colorNeutralBackground1} />
          <rect width="3" height="6" fill={hue} />
        </pattern>
      </defs>
      {/* Outlines last, so that they lie over their neighbours. */}
      {parts
        .toSorted((a, b) => Number(a.fill !== 'filled') - Number(b.fill !== 'filled'))
        .map(({ name, from, width, fill }) => (
          <rect
            key={name}
            x={percent(from)}
            y="5"
            width={percent(width)}
            height="16"
            fill={fills[fill]}
            stroke={fill === 'filled' ? tokens.colorNeutralBackground1 : hue}
            strokeWidth="1.5"
          />
        ))}
      {limitAt !== undefined && (
        <line
          x1={percent(limitAt)}
          x2={percent(limitAt)}
          y1="0"
          y2="26"
          stroke={tokens.colorNeutralForeground1}
          strokeWidth="2"
          strokeDasharray="3 2"
        />
      )}
    </svg>
  );
}

import { makeStyles, tokens } from '@fluentui/react-components';
import { type BeamPart, beamInWords } from '../model/beams';

const useStyles = makeStyles({
  beam: { display: 'block', width: '100%', height: '26px', overflow: 'visible' },
});

const percent = (share: number) => `${100 * share}%`;

/** An option's cost by arm: control outlined, each active arm filled. */
export function Beam({
  parts,
  hue,
  currency,
  limit,
}: {
  parts: readonly BeamPart[];
  hue: string;
  currency: string;
  /** The limit of money, drawn through the beam. */
  limit: { amount: number; at: number } | undefined;
}) {
  const styles = useStyles();
  return (
    <svg className={styles.beam} role="img" aria-label={beamInWords(parts, currency, limit?.amount)}>
      {/* Control last, so that its outline lies over its neighbour. */}
      {parts.toReversed().map(({ name, from, width, active }) => (
        <rect
          key={name}
          x={percent(from)}
          y="5"
          width={percent(width)}
          height="16"
          fill={active ? hue : tokens.colorNeutralBackground1}
          stroke={active ? tokens.colorNeutralBackground1 : hue}
          strokeWidth="1.5"
        />
      ))}
      {limit && (
        <line
          x1={percent(limit.at)}
          x2={percent(limit.at)}
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

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
}: {
  parts: readonly BeamPart[];
  hue: string;
  currency: string;
}) {
  const styles = useStyles();
  return (
    <svg className={styles.beam} role="img" aria-label={beamInWords(parts, currency)}>
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
    </svg>
  );
}

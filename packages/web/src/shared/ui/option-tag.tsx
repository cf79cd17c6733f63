import { makeStyles, mergeClasses } from '@fluentui/react-components';
import { optionHue, ownTokens } from './own-tokens';

const useStyles = makeStyles({
  tag: {
    display: 'grid',
    placeItems: 'center',
    flexShrink: 0,
    width: '24px',
    height: '24px',
    borderRadius: '6px',
    color: ownTokens.onHue,
    fontSize: '14px',
    lineHeight: '20px',
    fontWeight: 900,
    printColorAdjust: 'exact',
  },
  outlined: { backgroundColor: 'transparent', border: '2px solid' },
  small: { width: '20px', height: '20px', borderRadius: '5px', fontSize: '13px' },
});

/** An option's letter on its hue. */
export function OptionTag({
  letter,
  position,
  small,
  outlined,
}: {
  letter: string;
  position: number;
  small?: boolean;
  /** Ruled out: the letter alone has the hue. */
  outlined?: boolean;
}) {
  const styles = useStyles();
  return (
    <span
      className={mergeClasses(styles.tag, small && styles.small, outlined && styles.outlined)}
      style={outlined ? { color: optionHue(position) } : { backgroundColor: optionHue(position) }}
    >
      {letter}
    </span>
  );
}

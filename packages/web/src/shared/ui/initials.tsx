import { makeStyles, mergeClasses } from '@fluentui/react-components';
import { onBar, ownTokens } from './own-tokens';

const useStyles = makeStyles({
  disc: {
    display: 'grid',
    placeItems: 'center',
    flexShrink: 0,
    width: '30px',
    height: '30px',
    borderRadius: '50%',
    border: `2px solid ${ownTokens.bar}`,
    color: onBar.text,
    fontSize: '13px',
    lineHeight: '16px',
    fontWeight: 700,
  },
  tone0: { backgroundColor: '#33507a' },
  tone1: { backgroundColor: '#7a4b33' },
  tone2: { backgroundColor: '#2f6658' },
  tone3: { backgroundColor: '#5a4675' },
});

/** A person as two letters on a disc; `tone` tells neighbours apart. */
export function Initials({ name, tone }: { name: string; tone: number }) {
  const styles = useStyles();
  const tones = [styles.tone0, styles.tone1, styles.tone2, styles.tone3];
  return (
    <span aria-hidden="true" className={mergeClasses(styles.disc, tones[tone % tones.length])}>
      {initialsOf(name)}
    </span>
  );
}

/** First letters of the first and last word. */
export function initialsOf(name: string): string {
  const words = name.trim().split(/\s+/);
  const ends = words.length > 1 ? [words[0], words.at(-1)] : words;
  return ends.map((word) => [...(word ?? '')][0]?.toLocaleUpperCase('en-GB') ?? '').join('');
}

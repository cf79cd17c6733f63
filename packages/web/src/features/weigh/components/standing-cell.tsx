import { makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import { CheckmarkCircleFilled, WarningFilled } from '@fluentui/react-icons';
import { ownTokens } from '../../../shared/ui/own-tokens';
import { standingInWords } from '../model/standing-words';
import type { Weighed, Weighing } from '../model/weighing';

const useStyles = makeStyles({
  told: { fontSize: '13px', lineHeight: '17px', overflowWrap: 'anywhere' },
  what: { fontWeight: 700 },
  icon: { marginRight: '4px', verticalAlign: '-2px', fontSize: '14px' },
  fits: { color: ownTokens.fits },
  over: { color: ownTokens.over },
  more: { color: tokens.colorNeutralForeground2 },
});

/** How an option stands against the limits: with an icon and words, never by colour alone. */
export function StandingCell({ option, weighing }: { option: Weighed; weighing: Weighing }) {
  const styles = useStyles();
  if (option.ruling?.kind === 'not-admissible') {
    return <div className={styles.told}>Ruled out by {option.ruling.by}, kept to compare</div>;
  }
  const told = standingInWords(option, weighing);
  if (!told) return null;
  const { tone, what, more } = told;
  const Icon = tone === 'fits' ? CheckmarkCircleFilled : WarningFilled;
  return (
    <div className={styles.told}>
      <span className={mergeClasses(styles.what, tone === 'fits' ? styles.fits : styles.over)}>
        <Icon className={styles.icon} aria-hidden="true" />
        {what}
      </span>
      {more.map((line) => (
        <div key={line} className={styles.more}>
          {line}
        </div>
      ))}
    </div>
  );
}

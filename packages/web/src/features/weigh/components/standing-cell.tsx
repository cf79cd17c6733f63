import { makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import { CheckmarkCircleFilled, WarningFilled } from '@fluentui/react-icons';
import { ownTokens } from '../../../shared/ui/own-tokens';
import type { Difference } from '../model/against';
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

interface StandingCellProps {
  option: Weighed;
  weighing: Weighing;
  /** With one, how the option differs from it takes the place of what is to spare or missing. */
  reference: Weighed | undefined;
  difference: Difference | undefined;
}

/** How an option stands against the limits: with an icon and words, never by colour alone. */
export function StandingCell({ option, weighing, reference, difference }: StandingCellProps) {
  const styles = useStyles();
  const ruledOut = option.ruling?.kind === 'not-admissible';
  const told = ruledOut ? undefined : standingInWords(option, weighing);
  const Icon = told?.tone === 'fits' ? CheckmarkCircleFilled : WarningFilled;
  return (
    <div className={styles.told}>
      {ruledOut && `Ruled out by ${option.ruling?.by}${reference ? '' : ', kept to compare'}`}
      {told && (
        <span className={mergeClasses(styles.what, told.tone === 'fits' ? styles.fits : styles.over)}>
          <Icon className={styles.icon} aria-hidden="true" />
          {told.what}
        </span>
      )}
      {!reference &&
        told?.more.map((line) => (
          <div key={line} className={styles.more}>
            {line}
          </div>
        ))}
      {reference && <div>{difference?.says ?? 'The others are told against this one.'}</div>}
    </div>
  );
}

import { makeStyles, tokens } from '@fluentui/react-components';
import { WarningFilled } from '@fluentui/react-icons';
import type { Infeasible } from '@steelyard/calc';
import { count, power } from '../../../shared/format/numbers';
import { ownTokens } from '../../../shared/ui/own-tokens';
import { familyUiOf } from '../../designs/families/registry';
import type { Weighed } from '../model/weighing';

const useStyles = makeStyles({
  told: { display: 'flex', gap: '8px', fontSize: '13px', lineHeight: '18px', overflowWrap: 'anywhere' },
  icon: { flexShrink: 0, marginTop: '2px', fontSize: '15px', color: ownTokens.over },
  what: { fontWeight: 700, color: ownTokens.over },
  limits: { color: tokens.colorNeutralForeground2 },
});

/** Why an option has no figures: it cannot be computed as it stands, or cannot reach the power. */
export function OutOfReach({ option }: { option: Weighed }) {
  const styles = useStyles();
  const { appraisal, error } = option;
  const infeasible = appraisal?.feasible === false ? appraisal.infeasible : undefined;
  const message = error?.message ?? infeasible?.message;
  if (message === undefined) return null;
  const limits = infeasible ? limitsOf(option, infeasible) : [];
  return (
    <div className={styles.told}>
      <WarningFilled className={styles.icon} aria-hidden="true" />
      <div>
        <span className={styles.what}>{error ? 'Cannot be computed.' : 'Cannot reach the power.'}</span>{' '}
        {message}
        {limits.length > 0 && <div className={styles.limits}>{`${limits.join('. ')}.`}</div>}
      </div>
    </div>
  );
}

function limitsOf(
  { family, plan, words }: Weighed,
  { limitingPower, fewestUnits }: Infeasible['infeasible'],
) {
  const unit = familyUiOf(family).sizeNoun(plan, words);
  return [
    ...(limitingPower === undefined ? [] : [`Limiting power ${power(limitingPower)}`]),
    ...(fewestUnits === undefined ? [] : [`${unit} that would do: ${count(fewestUnits)}`]),
  ];
}

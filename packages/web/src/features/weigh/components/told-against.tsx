import { makeStyles } from '@fluentui/react-components';
import { capitalised } from '../../../shared/format/lists';
import { money } from '../../../shared/format/money';
import { ownTokens } from '../../../shared/ui/own-tokens';
import { differenceFrom, referenceOf } from '../model/against';
import type { Weighed, Weighing } from '../model/weighing';
import { useWeighView } from './use-weigh-view';

const useStyles = makeStyles({
  told: {
    marginBottom: '12px',
    padding: '8px 10px',
    borderRadius: '6px',
    backgroundColor: ownTokens.brassSoft,
    overflowWrap: 'anywhere',
  },
});

/** How the option of a panel differs from the one that all are told against; silent where there is none. */
export function ToldAgainst({ option, weighing }: { option: Weighed; weighing: Weighing }) {
  const styles = useStyles();
  const { view } = useWeighView();
  const reference = referenceOf(weighing, view.against);
  const difference =
    reference &&
    reference.id !== option.id &&
    differenceFrom(option, reference, (amount) => money(amount, weighing.currency));
  return (
    <div role="status">{difference && <p className={styles.told}>{capitalised(difference.says)}.</p>}</div>
  );
}

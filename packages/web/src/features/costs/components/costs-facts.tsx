import { makeStyles } from '@fluentui/react-components';
import type { CostPlanView, StudyView } from '@steelyard/api/contract/studies';
import { exactMoney } from '../../../shared/format/money';
import { figure, percent, withUnit } from '../../../shared/format/numbers';
import { type Fact, Facts } from '../../../shared/ui/facts';
import { TitledSection } from '../../../shared/ui/titled-section';
import { ownLines, sharedLines, timeLines, treatmentLines, treatmentName } from '../model/cost-lines';

const useStyles = makeStyles({ parts: { display: 'grid', gap: '10px', maxWidth: '560px' } });

/** Money and months for those who read them. */
export function CostsFacts({
  study,
  costs: { costs, timeline, source },
}: {
  study: StudyView;
  costs: CostPlanView;
}) {
  const styles = useStyles();
  const amount = (value: number | undefined) =>
    value === undefined ? 'not stated' : exactMoney(value, costs.currency);
  const parts: [title: string, facts: Fact[]][] = [
    [
      'Shared by all arms',
      sharedLines(study).map(({ key, label }) => ({ name: label, value: amount(costs[key]) })),
    ],
    [
      'Of each arm’s own',
      [
        ...ownLines.map(({ key, label }) => ({ name: label, value: amount(costs[key]) })),
        { name: 'Overhead', value: costs.overhead === undefined ? 'none' : percent(costs.overhead, 2) },
      ],
    ],
    [
      'By treatment',
      treatmentLines(study).flatMap(({ key, label }) =>
        study.treatments.map((_, place) => ({
          name: `${label}, ${treatmentName(study, place)}`,
          value: amount(costs[key]?.[place]),
        })),
      ),
    ],
    [
      'Accrual and months',
      timeLines(study).map(({ key, label, unit }) => {
        const value = timeline[key];
        return { name: label, value: value === undefined ? 'not stated' : withUnit(figure(value), unit) };
      }),
    ],
  ];
  return (
    <div className={styles.parts}>
      {parts.map(([title, facts]) => (
        <TitledSection key={title} title={title} level={2}>
          <Facts facts={facts} />
        </TitledSection>
      ))}
      <p>{source ? `Source: ${source}.` : 'Nobody has said where these figures come from.'}</p>
    </div>
  );
}

import { makeStyles } from '@fluentui/react-components';
import type { Feasible, Hold } from '@steelyard/calc';
import type { ReactNode } from 'react';
import { capitalised } from '../../../shared/format/lists';
import { count, percent, power } from '../../../shared/format/numbers';
import { DataTable } from '../../../shared/ui/data-table';
import { type Fact, Facts } from '../../../shared/ui/facts';
import { TitledSection } from '../../../shared/ui/titled-section';
import { Word } from '../../../shared/ui/words';
import { StructureFacts } from '../../designs/components/structure-facts';
import { familyUiOf } from '../../designs/families/registry';
import { mayEdit } from '../../designs/model/rights';
import { structureInWords } from '../../designs/model/structure-words';
import { Levers } from '../../levers/components/levers';
import { assumptionsOf } from '../model/assumptions';
import type { Weighed, Weighing } from '../model/weighing';
import { Cautions } from './cautions';
import { LedgerValues } from './ledger-values';
import { CostsOfOption, MonthsOfOption } from './money-and-months';
import { OutOfReach } from './out-of-reach';
import { useWeighView } from './use-weigh-view';

const useStyles = makeStyles({
  details: {
    display: 'grid',
    alignItems: 'start',
    gap: '14px 28px',
    gridTemplateColumns: 'repeat(auto-fit, minmax(min(100%, 290px), 1fr))',
  },
});

interface OptionDetailsProps {
  option: Weighed;
  weighing: Weighing;
  /** The fields in which its structure and overrides are edited; without them both are read. */
  fields?: ReactNode;
  /** What may be done with the option as a whole. */
  actions?: ReactNode;
}

/** All that is known of one option: its size, what it rests on, its groups, money, months and cautions. */
export function OptionDetails({ option, weighing, fields, actions }: OptionDetailsProps) {
  const styles = useStyles();
  const { show } = useWeighView();
  const { appraisal } = option;
  const { study, ledger, currency } = weighing;
  const size = appraisal?.feasible ? appraisal : undefined;
  return (
    <div className={styles.details}>
      {size ? <SizeOfOption option={option} weighing={weighing} /> : <OutOfReach option={option} />}
      {fields ?? (
        <>
          {structureInWords(option.plan.structure).length > 0 && (
            <TitledSection level={3} title="Structure">
              <StructureFacts plan={option.plan} />
            </TitledSection>
          )}
          <TitledSection
            level={3}
            title={
              <>
                From the <Word is="ledger">ledger</Word>
              </>
            }
          >
            <LedgerValues assumptions={assumptionsOf(option, ledger, study.outcomeUnit)} />
          </TitledSection>
        </>
      )}
      <Levers
        option={option}
        weighing={weighing}
        onTried={mayEdit(study.role) ? (tried) => show({ option: tried }) : undefined}
      />
      {size?.costs && (
        <CostsOfOption costs={size.costs} size={size} arms={option.words.arms} currency={currency} />
      )}
      {size?.timeline && <MonthsOfOption timeline={size.timeline} />}
      {appraisal && (
        <TitledSection level={3} title="Cautions">
          <Cautions cautions={appraisal.cautions} />
        </TitledSection>
      )}
      {actions}
    </div>
  );
}

function SizeOfOption({ option, weighing: { hold } }: { option: Weighed; weighing: Weighing }) {
  const { appraisal, family, plan, words } = option;
  if (!appraisal?.feasible) return null;
  const { sequences } = familyUiOf(family).schematic(plan, words);
  return (
    <TitledSection level={3} title="Size">
      <Facts facts={sizeFacts(appraisal, option, hold)} />
      <DataTable
        label="Groups"
        columns={[
          { label: 'Group' },
          { label: 'Analysed', figures: true },
          { label: 'Recruited', figures: true },
        ]}
        rows={appraisal.groups.map((group, index) => ({
          key: group.label,
          cells: [sequences[index]?.name ?? group.label, count(group.participants), count(group.recruited)],
        }))}
      />
    </TitledSection>
  );
}

function sizeFacts(size: Feasible, { family, plan, words }: Weighed, hold: Hold): Fact[] {
  const face = familyUiOf(family);
  const { clusters, recruitedClusters, clusterSize } = size;
  const participants = capitalised(words.participants.many);
  const clustersNoun = capitalised(words.clusters.many);
  const reached = {
    power: `fewest that reach ${percent(hold.power)}: ${power(size.power)}, sizes round up`,
    budget: `the most within the budget: ${power(size.power)}`,
    sizes: `as entered: ${power(size.power)}`,
  }[hold.kind];
  return [
    { name: face.sizeNoun(plan, words), value: count(size.units), note: reached },
    ...(clusterSize === undefined
      ? []
      : [
          {
            name: face.clusterSizeNoun?.(words) ?? `${participants} in each ${words.clusters.one}`,
            value: count(clusterSize),
          },
        ]),
    ...(clusters === undefined ? [] : [{ name: `${clustersNoun} analysed`, value: count(clusters) }]),
    ...(recruitedClusters === undefined
      ? []
      : [{ name: `${clustersNoun} recruited`, value: count(recruitedClusters) }]),
    { name: `${participants} analysed`, value: count(size.participants) },
    { name: `${participants} recruited`, value: count(size.recruited) },
  ];
}

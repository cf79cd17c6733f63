import type { StudyView } from '@steelyard/api/contract/studies';
import type { CostPlan, TimelinePlan } from '@steelyard/calc';
import { capitalised } from '../../../shared/format/lists';
import type { NumberKind } from '../../../shared/ui/number-field-text';

type MoneyKey = Exclude<keyof CostPlan, 'currency' | 'perExposure' | 'perClusterPeriod'>;
type ByTreatmentKey = 'perExposure' | 'perClusterPeriod';

export interface MoneyLine {
  key: MoneyKey;
  label: string;
  hint: string;
  kind?: NumberKind;
}

export interface TreatmentLine {
  key: ByTreatmentKey;
  label: string;
  hint: string;
}

export interface TimeLine {
  key: keyof TimelinePlan;
  label: string;
  unit: string;
  hint: string;
}

/** What all arms share: it is split between them. */
export function sharedLines({ participants, clusters }: StudyView): MoneyLine[] {
  return [
    { key: 'fixed', label: 'Fixed', hint: 'Once, whatever the size: set-up, approvals, database, analysis.' },
    { key: 'perMonth', label: 'Each month', hint: 'Staff and running costs from start-up to close-out.' },
    { key: 'perRecruited', label: `Each ${participants.one} recruited`, hint: 'Consent, screening, travel.' },
    ...(clusters
      ? [
          {
            key: 'perCluster' as const,
            label: `Each ${clusters.one}`,
            hint: 'Opening, training and visiting it.',
          },
        ]
      : []),
  ];
}

/** What each arm bears by itself. */
export const ownLines: MoneyLine[] = [
  { key: 'perArm', label: 'Each arm', hint: 'Once for an arm, such as a batch of its own.' },
  { key: 'perMeasurement', label: 'Each measurement', hint: 'One visit or test of one person.' },
];

export const overheadLine: MoneyLine = {
  key: 'overhead',
  label: 'Overhead',
  hint: 'On top of everything, in percent.',
  kind: 'percent',
};

/** What goes by treatment. */
export function treatmentLines({ participants, clusters }: StudyView): TreatmentLine[] {
  return [
    {
      key: 'perExposure',
      label: `Each ${participants.one} treated`,
      hint: `One ${participants.one} given one treatment once; in a crossover each takes several.`,
    },
    ...(clusters
      ? [
          {
            key: 'perClusterPeriod' as const,
            label: `Each ${clusters.one} in each period`,
            hint: `What a ${clusters.one} costs while it gives the treatment.`,
          },
        ]
      : []),
  ];
}

/** What a study’s months go to. */
export function timeLines({ participants, clusters }: StudyView): TimeLine[] {
  const months = 'months';
  return [
    { key: 'startUp', label: 'Start-up', unit: months, hint: 'Before the first person is recruited.' },
    {
      key: 'accrualPerMonth',
      label: 'Accrual, whole study',
      unit: 'a month',
      hint: `How many ${participants.many} are recruited each month, all sites together.`,
    },
    ...(clusters
      ? [
          {
            key: 'accrualPerClusterPerMonth' as const,
            label: `Accrual in each ${clusters.one}`,
            unit: 'a month',
            hint: 'State this or the accrual of the whole study, not both.',
          },
        ]
      : []),
    { key: 'followUp', label: 'Follow-up', unit: months, hint: 'From recruitment to the last measurement.' },
    {
      key: 'period',
      label: 'Period',
      unit: months,
      hint: 'One treatment period, where a design has several.',
    },
    { key: 'washout', label: 'Washout', unit: months, hint: 'Between two periods of a crossover.' },
    { key: 'closeOut', label: 'Close-out', unit: months, hint: 'From the last measurement to the report.' },
  ];
}

export const treatmentName = ({ treatments }: StudyView, place: number): string =>
  capitalised(treatments[place]?.name ?? `treatment ${place + 1}`);

/** What a part of the form is called. */
export function costLabel(study: StudyView): (path: string) => string {
  const lines = [
    ...sharedLines(study),
    ...ownLines,
    overheadLine,
    ...treatmentLines(study),
    ...timeLines(study),
  ];
  return (path) => {
    if (path === 'source') return 'Source';
    const [, key, place] = path.split('.');
    const label = lines.find((line) => line.key === key)?.label ?? 'Currency';
    return place === undefined ? label : `${label}, ${treatmentName(study, Number(place))}`;
  };
}

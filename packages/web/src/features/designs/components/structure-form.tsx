import { makeStyles, tokens } from '@fluentui/react-components';
import type { ComponentType } from 'react';
import { NumberField } from '../../../shared/ui/number-field';
import { RadioField } from '../../../shared/ui/radio-field';
import { familyUiOf } from '../families/registry';
import type { StructurePart } from '../families/structure-part';
import { CohortField } from './cohort-field';
import { ComparisonFields } from './comparison-fields';
import { MeasurementFields } from './measurement-fields';
import { levelsInWords, Schedule } from './schedule';
import { ScheduleGrid } from './schedule-grid';
import { SequencesField } from './sequences-field';
import { ShareFields } from './share-fields';
import { type PartProps, type StructureFormProps, structurePath } from './structure-props';
import { SwitchField } from './switch-field';
import { TreatmentsField } from './treatments-field';

const useStyles = makeStyles({
  picture: { color: tokens.colorNeutralForeground1 },
  key: { color: tokens.colorNeutralForeground2, fontSize: '13px', lineHeight: '18px' },
});

/** The part of an option's form that is its family's own: the treatments, then each part the family asks for. */
export function StructureForm(props: StructureFormProps) {
  const { plan, study, words } = props;
  const parts = familyUiOf(plan.family).structure(plan, study, words);
  return (
    <>
      <TreatmentsField {...props} />
      {parts.map((part) => (
        <Part key={'key' in part ? part.key : part.part} {...props} part={part} />
      ))}
    </>
  );
}

function Part(props: StructureFormProps & { part: StructurePart }) {
  const Fields = fields[props.part.part] as ComponentType<StructureFormProps & { part: StructurePart }>;
  return <Fields {...props} />;
}

const fields: { [Kind in StructurePart['part']]: ComponentType<PartProps<Kind>> } = {
  told: ({ part }) => <p>{part.says}</p>,
  whole: ({ part, form }) => (
    <NumberField
      beside
      kind="whole"
      label={part.label}
      {...(part.hint === undefined ? {} : { hint: part.hint })}
      control={form.control}
      name={structurePath(part.key)}
    />
  ),
  choice: ({ part, form }) => (
    <RadioField
      label={part.label}
      control={form.control}
      name={structurePath(part.key)}
      choices={part.choices}
    />
  ),
  switch: SwitchField,
  shares: ShareFields,
  measurements: MeasurementFields,
  comparisons: ComparisonFields,
  sequences: SequencesField,
  schedule: ScheduleGrid,
  cohort: CohortField,
  picture: Picture,
};

const cell = { width: 32, height: 18 };

function Picture({ plan, words }: PartProps<'picture'>) {
  const styles = useStyles();
  const schematic = familyUiOf(plan.family).schematic(plan, words);
  const { sequences, periods } = schematic;
  const key = levelsInWords(schematic, words.arms);
  return (
    <div className={styles.picture}>
      <Schedule
        schematic={schematic}
        arms={words.arms}
        hue="currentColor"
        width={Math.min(264, 2 + cell.width * periods.length)}
        height={Math.min(220, 2 + cell.height * sequences.length)}
        cell={cell}
      />
      {key && <p className={styles.key}>{key}</p>}
    </div>
  );
}

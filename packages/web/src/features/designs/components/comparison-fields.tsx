import { Checkbox, Field, makeStyles, Radio, RadioGroup } from '@fluentui/react-components';
import type { StudyView } from '@steelyard/api/contract/studies';
import type { Comparisons } from '@steelyard/calc';
import { type FieldPath, useController } from 'react-hook-form';
import { NumberField } from '../../../shared/ui/number-field';
import { TextAreaField } from '../../../shared/ui/text-area-field';
import { adjustments, compared, comparisonsOf, inPairs, powerGoals } from '../families/comparisons';
import type { OptionDraft } from '../families/family-ui';
import { type PartProps, structurePath } from './structure-props';

const useStyles = makeStyles({ fields: { display: 'grid', gap: '8px' } });

/** What several comparisons are against, how they are adjusted for, which power counts, and why. */
export function ComparisonFields(props: PartProps<'comparisons'>) {
  const styles = useStyles();
  const { form, plan, part } = props;
  const path = structurePath('comparisons');
  const { against = 'control' } = comparisonsOf(plan);
  const offers = against === 'all-pairs' ? inPairs(part.offers) : part.offers;

  const compare = (next: Comparisons['against']) => {
    const { effects: _, ...stance } = comparisonsOf(plan) as Comparisons;
    const narrowed: Comparisons = {
      ...stance,
      against: next,
      adjust: inPairs(part.offers).adjustments.find((adjust) => adjust === stance.adjust) ?? 'bonferroni',
      powerGoal: 'per-comparison',
    };
    const changed = next === 'control' ? { ...stance, against: next } : narrowed;
    form.setValue(path, changed as never, { shouldDirty: true, shouldValidate: true });
  };

  return (
    <div className={styles.fields}>
      {part.offers.allPairs && (
        <Stance
          label="Comparisons"
          told={compared}
          offered={['control', 'all-pairs']}
          chosen={against}
          onChoose={compare}
        />
      )}
      <StanceField
        {...props}
        of="adjust"
        label="Adjustment for several comparisons"
        told={adjustments}
        offered={offers.adjustments}
      />
      {offers.goals.length > 1 && (
        <StanceField
          {...props}
          of="powerGoal"
          label="Which power counts"
          told={powerGoals}
          offered={offers.goals}
        />
      )}
      {offers.effects && <EffectFields {...props} />}
      <TextAreaField
        label="Reason for this stance"
        hint="Reviewers ask why comparisons are adjusted for, or not, and which power counts."
        control={form.control}
        name="plan.multiplicityReason"
      />
    </div>
  );
}

interface StanceProps<Value extends string> {
  label: string;
  told: Record<Value, { label: string; says: string }>;
  offered: readonly Value[];
}

function StanceField<Value extends string>(
  props: StanceProps<Value> & Pick<PartProps<'comparisons'>, 'form'> & { of: string },
) {
  const { field, fieldState } = useController({
    control: props.form.control,
    name: structurePath(`comparisons.${props.of}`),
  });
  return (
    <Stance
      {...props}
      chosen={field.value as unknown as Value}
      fault={fieldState.error?.message}
      onChoose={field.onChange}
    />
  );
}

function Stance<Value extends string>(
  props: StanceProps<Value> & { chosen: Value; fault?: string | undefined; onChoose: (value: Value) => void },
) {
  const { label, told, offered, chosen, fault, onChoose } = props;
  return (
    <Field label={label} validationMessage={fault}>
      <RadioGroup value={chosen} onChange={(_, { value }) => onChoose(value as Value)}>
        {offered.map((value) => (
          <Radio key={value} value={value} label={`${told[value].label}. ${told[value].says}`} />
        ))}
      </RadioGroup>
    </Field>
  );
}

/** The target of each active arm, where they are not all the study's. */
function EffectFields({ form, study, words }: PartProps<'comparisons'>) {
  const path = structurePath('comparisons.effects');
  const { field } = useController({ control: form.control, name: path });
  const active = words.arms.slice(1);
  const { name, kind, target } = effectOf(study);
  return (
    <>
      <Checkbox
        label="Each arm has a target of its own"
        checked={Array.isArray(field.value)}
        onChange={(_, { checked }) => field.onChange(checked === true ? active.map(() => target) : null)}
      />
      {Array.isArray(field.value) &&
        active.map((arm, index) => (
          <NumberField
            key={arm}
            beside
            kind={kind}
            {...(kind === 'number' && study.outcomeUnit && study.plan.outcome.kind === 'continuous'
              ? { unit: study.outcomeUnit }
              : {})}
            label={`${name}, ${arm}`}
            control={form.control}
            name={`${path}.${index}` as FieldPath<OptionDraft>}
          />
        ))}
    </>
  );
}

/** How the outcome states a target, and the study's own where it is one of the same kind. */
function effectOf({ plan: { outcome } }: StudyView): {
  name: string;
  kind: 'number' | 'percent';
  target: number | undefined;
} {
  switch (outcome.kind) {
    case 'continuous':
      return { name: 'Target difference', kind: 'number', target: outcome.difference };
    case 'binary':
      return { name: 'Proportion', kind: 'percent', target: undefined };
    case 'time-to-event':
      return { name: 'Hazard ratio', kind: 'number', target: outcome.hazardRatio };
    case 'count':
      return { name: 'Rate ratio', kind: 'number', target: outcome.rateRatio };
    case 'ordinal':
      return { name: 'Odds ratio', kind: 'number', target: outcome.oddsRatio };
  }
}

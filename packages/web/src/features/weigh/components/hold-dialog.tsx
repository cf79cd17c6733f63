import type { DesignSetView } from '@steelyard/api/contract/design-sets';
import { changedDesignSetSchema } from '@steelyard/api/contract/options';
import type { Hold } from '@steelyard/calc';
import { useQueryClient } from '@tanstack/react-query';
import { NumberField } from '../../../shared/ui/number-field';
import { textOf } from '../../../shared/ui/number-field-text';
import { RadioField } from '../../../shared/ui/radio-field';
import { keepDesignSet, putDesignSet } from '../../designs/api/design-set';
import { useKeptForm } from '../../unsaved/api/use-kept-form';
import { BothVersionsByHistory } from '../../unsaved/components/both-versions';
import { KeptDialog } from '../../unsaved/components/kept-dialog';
import { differencesOf } from '../../unsaved/model/differences';
import { textOfValues } from '../../unsaved/model/kept-edits';
import { useSizes } from '../api/use-sizes';
import { entersSizes } from '../model/enters-sizes';
import { holdMeanings } from '../model/hold-words';
import type { Weighing } from '../model/weighing';

interface HoldForm {
  hold: { kind: Hold['kind']; power: number | undefined; budget: number | undefined };
}

const names: Record<Hold['kind'], string> = { power: 'Power', budget: 'Budget', sizes: 'Sizes' };
const labels: Record<string, string> = { kind: 'Keep equal', power: 'Power, %', budget: 'Budget' };

/** What is kept equal, and at what. */
export function HoldDialog({ weighing, onClose }: { weighing: Weighing; onClose: () => void }) {
  const queryClient = useQueryClient();
  const { study, designSet, limits, currency } = weighing;
  const sizes = useSizes(weighing);
  const valuesOf = (view: DesignSetView | null): HoldForm => {
    const { kind, power, ...rest } = (view ?? designSet).hold;
    return { hold: { kind, power, budget: 'budget' in rest ? rest.budget : limits.limits.money } };
  };
  const kept = useKeptForm({
    what: `${study.id}/hold`,
    view: designSet,
    valuesOf,
    schema: changedDesignSetSchema,
    bodyOf: ({ hold }, version, view) => ({
      // Sizes are tried out first; what is held meanwhile stays.
      hold: holdIn(entersSizes(hold.kind, weighing) ? { ...valuesOf(view).hold, power: hold.power } : hold),
      version,
      order: (view ?? designSet).options.map(({ id }) => id),
    }),
    send: async (body) =>
      textOfValues(body.hold) === textOfValues(designSet.hold) ? designSet : putDesignSet(study.id, body),
    onStored: (view) => keepDesignSet(queryClient, study.id, view),
    onSaved: (_, { hold }) => (entersSizes(hold.kind, weighing) ? sizes.hold() : sizes.undo()),
  });
  const { control } = kept.form;
  const { kind } = kept.values.hold;
  return (
    <KeptDialog
      title="What is kept equal"
      label="Hold"
      verb="Hold"
      kept={kept}
      conflict={
        kept.theirs && (
          <BothVersionsByHistory
            studyId={study.id}
            what="what is held and the order of the options"
            differences={differencesOf(
              told(kept.values),
              told(valuesOf(kept.theirs.view)),
              (path) => labels[path] ?? path,
            )}
            onKeepMine={kept.keepMine}
            onTakeTheirs={kept.takeTheirs}
          />
        )
      }
      onClose={onClose}
    >
      <RadioField
        label="Keep equal"
        hint={entersSizes(kind, weighing) ? asNow : undefined}
        control={control}
        name="hold.kind"
        choices={kinds.map((value) => ({ value, label: holdMeanings[value] }))}
      />
      <NumberField
        label="Power"
        kind="percent"
        hint={kind === 'power' ? undefined : 'What every option is judged by.'}
        control={control}
        name="hold.power"
      />
      {kind === 'budget' && (
        <NumberField label="Budget" kind="money" unit={currency} control={control} name="hold.budget" />
      )}
    </KeptDialog>
  );
}

const asNow = 'Each option is entered at the size it has now, until you save the sizes or undo them.';

const kinds = ['power', 'budget', 'sizes'] as const;

/** Only a held budget states one. */
const holdIn = ({ kind, power, budget }: HoldForm['hold']) =>
  kind === 'budget' ? { kind, power, budget } : { kind, power };

const told = ({ hold }: HoldForm) => {
  const { kind, power, budget } = hold;
  return {
    kind: names[kind],
    power: textOf(power, 'percent'),
    ...(kind === 'budget' ? { budget: textOf(budget, 'money') } : {}),
  };
};

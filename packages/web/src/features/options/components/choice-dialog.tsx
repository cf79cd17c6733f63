import type { DesignSetView } from '@steelyard/api/contract/design-sets';
import { useQueryClient } from '@tanstack/react-query';
import { useMemo } from 'react';
import { RadioField } from '../../../shared/ui/radio-field';
import { TextAreaField } from '../../../shared/ui/text-area-field';
import { keepDesignSet } from '../../designs/api/design-set';
import { useKeptForm } from '../../unsaved/api/use-kept-form';
import { BothVersions, BothVersionsByHistory } from '../../unsaved/components/both-versions';
import { KeptDialog } from '../../unsaved/components/kept-dialog';
import { differencesOf } from '../../unsaved/model/differences';
import type { Weighed, Weighing } from '../../weigh/model/weighing';
import { recordChoice } from '../api/options';
import { type ChoiceForm, choiceBodyOf, choiceFormSchema, choiceOf } from '../model/choice-form';

/** Which option, why, and why not each other. */
export function ChoiceDialog({ weighing, onClose }: { weighing: Weighing; onClose: () => void }) {
  const queryClient = useQueryClient();
  const { study, designSet, options } = weighing;
  const kept = useKeptForm({
    what: `${study.id}/choice`,
    view: designSet,
    valuesOf,
    schema: useMemo(() => choiceFormSchema(options), [options]),
    bodyOf: versioned,
    send: (form) => recordChoice(study.id, choiceBodyOf(form, options)),
    onStored: (view) => keepDesignSet(queryClient, study.id, view),
  });
  const { control } = kept.form;
  const chosen = kept.values.optionId;
  const others = options.filter(({ id }) => id !== chosen);
  const theirs = kept.theirs?.view?.choice;
  const both = kept.theirs && {
    differences: differencesOf(
      told(kept.values, options),
      told(valuesOf(kept.theirs.view), options),
      (label) => label,
    ),
    onKeepMine: kept.keepMine,
    onTakeTheirs: kept.takeTheirs,
  };

  return (
    <KeptDialog
      title="Record the choice"
      label="Choice"
      verb="Record the choice"
      kept={kept}
      conflict={
        both &&
        (theirs ? (
          <BothVersions {...both} by={theirs.by} at={theirs.at} />
        ) : (
          <BothVersionsByHistory {...both} studyId={study.id} what="the choice" />
        ))
      }
      onClose={onClose}
    >
      <RadioField
        label="The option settled on"
        control={control}
        name="optionId"
        choices={options
          .filter(mayBeChosen)
          .map(({ id, letter, name }) => ({ value: id, label: `${letter}, ${name}` }))}
      />
      <TextAreaField label="Why this one" rows={3} control={control} name="why" />
      {chosen &&
        others.map((option) => (
          <TextAreaField
            key={option.id}
            label={`Why not ${option.letter}, ${option.name}`}
            hint={mayBeChosen(option) ? undefined : `Ruled out: ${option.ruling?.reason}`}
            control={control}
            name={`whyNot.${option.id}`}
          />
        ))}
    </KeptDialog>
  );
}

const mayBeChosen = ({ ruling }: Weighed): boolean => ruling?.kind !== 'not-admissible';

const valuesOf = (set: DesignSetView | null): ChoiceForm => choiceOf(set?.choice ?? null);

const versioned = (values: ChoiceForm, version: number | null) => ({ ...values, version });

/** A choice as one reads it, by what each part is called. */
function told({ optionId, why, whyNot }: ChoiceForm, options: readonly Weighed[]): Record<string, string> {
  const chosen = options.find(({ id }) => id === optionId);
  const against = options.map(({ id, letter, name }) => [`Why not ${letter}, ${name}`, whyNot[id] ?? '']);
  return {
    'The option settled on': chosen ? `${chosen.letter}, ${chosen.name}` : 'none',
    'Why this one': why,
    ...Object.fromEntries(against),
  };
}

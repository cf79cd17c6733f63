import type { OptionView } from '@steelyard/api/contract/design-sets';
import { newRulingSchema } from '@steelyard/api/contract/options';
import type { Ruling as Given } from '@steelyard/calc';
import { useQueryClient } from '@tanstack/react-query';
import { RadioField } from '../../../shared/ui/radio-field';
import { TextAreaField } from '../../../shared/ui/text-area-field';
import { keepOption } from '../../designs/api/design-set';
import { useKeptForm } from '../../unsaved/api/use-kept-form';
import { BothVersions } from '../../unsaved/components/both-versions';
import { KeptDialog } from '../../unsaved/components/kept-dialog';
import { differencesOf } from '../../unsaved/model/differences';
import { ruleOnOption } from '../api/options';
import { rulingWords } from '../model/ruling-words';

interface RulingDialogProps {
  studyId: string;
  option: OptionView;
  onClose: () => void;
}

/** Whether an option may be chosen, with the reason. */
export function RulingDialog({ studyId, option, onClose }: RulingDialogProps) {
  const queryClient = useQueryClient();
  const kept = useKeptForm({
    what: `${option.id}/ruling`,
    view: option,
    valuesOf: (view) => rulingIn(view ?? option),
    schema: newRulingSchema,
    bodyOf,
    send: (body) => ruleOnOption(studyId, option.id, body),
    onStored: (view) => {
      if (view) keepOption(queryClient, studyId, view);
      void queryClient.invalidateQueries({ queryKey: ['studies', studyId] });
    },
  });
  const { control } = kept.form;
  const theirs = kept.theirs?.view;
  return (
    <KeptDialog
      title={`Ruling on ${option.name}`}
      label="Ruling"
      verb="Rule"
      kept={kept}
      conflict={
        theirs && (
          <BothVersions
            differences={differencesOf(
              told(kept.values),
              told(rulingIn(theirs)),
              (path) => labels[path] ?? path,
            )}
            by={theirs.ruling?.by ?? null}
            at={theirs.ruling?.at ?? null}
            onKeepMine={kept.keepMine}
            onTakeTheirs={kept.takeTheirs}
          />
        )
      }
      onClose={onClose}
    >
      <RadioField
        label="Ruling"
        control={control}
        name="kind"
        choices={Object.entries(rulingWords).map(([value, label]) => ({ value, label }))}
      />
      <TextAreaField
        label="Reason"
        hint="Whoever reads the ruling later must be able to follow it."
        rows={3}
        control={control}
        name="reason"
      />
    </KeptDialog>
  );
}

const rulingIn = ({ ruling }: OptionView): Given => ({
  kind: ruling?.kind ?? 'admissible',
  reason: ruling?.reason ?? '',
});

const bodyOf = (given: Given, version: number | null) => ({ ...given, version });

const labels: Record<string, string> = { kind: 'Ruling', reason: 'Reason' };
const told = ({ kind, reason }: Given) => ({ kind: rulingWords[kind], reason });

import type { PlanningValueView, StudyView } from '@steelyard/api/contract/studies';
import type { OptionPlan } from '@steelyard/calc';
import type { FieldPath, UseFormReturn } from 'react-hook-form';
import type { OptionDraft, StudyWords } from '../families/family-ui';
import type { PartOf, StructurePart } from '../families/structure-part';

export interface StructureFormProps {
  form: UseFormReturn<OptionDraft>;
  plan: OptionPlan;
  study: StudyView;
  words: StudyWords;
  ledger: readonly PlanningValueView[];
}

export interface PartProps<Kind extends StructurePart['part']> extends StructureFormProps {
  part: PartOf<Kind>;
}

/** Where the form keeps a part of the structure; its type knows no more than that there is one. */
export const structurePath = (key: string) => `plan.structure.${key}` as FieldPath<OptionDraft>;

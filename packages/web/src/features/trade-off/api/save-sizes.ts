import type { OptionView } from '@steelyard/api/contract/design-sets';
import type { QueryClient } from '@tanstack/react-query';
import { designSetQuery, keepOption, putDesignSet } from '../../designs/api/design-set';
import { endSizing, rebase, resized, sizeIn } from '../../designs/model/drafts-of-sizes';
import { draftOf, sameOption } from '../../designs/model/option-draft';
import { changeOption } from '../../options/api/options';
import type { Weighed, Weighing } from '../../weigh/model/weighing';

/** The options that somebody else stored anew since their sizes were tried out: their forms show both versions. */
export const conflicting = (options: readonly Weighed[]): Weighed[] =>
  resized(options).filter(({ stored, draft }) => draft && !sameOption(draftOf(stored), draft.base));

/** Stores the sizes that are tried out, then that sizes are what is held; other edits of the options stay unsaved. */
export async function saveSizes(
  weighing: Weighing,
  personId: string,
  queryClient: QueryClient,
): Promise<void> {
  const { study, designSet, hold, options } = weighing;
  for (const option of resized(options)) {
    const stored = await storeSize(study.id, option);
    keepOption(queryClient, study.id, stored);
    rebase(personId, stored);
  }
  if (designSet.hold.kind !== hold.kind) {
    const order = designSet.options.map(({ id }) => id);
    const set = await putDesignSet(study.id, { version: designSet.version, hold, order });
    queryClient.setQueryData(designSetQuery(study.id).queryKey, set);
  }
  endSizing(personId, study.id);
}

function storeSize(studyId: string, { stored, draft }: Weighed): Promise<OptionView> {
  const { units, clusterSize } = draft ? sizeIn(draft) : {};
  const plan = {
    ...stored.plan,
    ...(units === undefined ? {} : { units }),
    ...(clusterSize === undefined ? {} : { clusterSize }),
  };
  return changeOption(studyId, stored.id, { version: stored.version, name: stored.name, plan });
}

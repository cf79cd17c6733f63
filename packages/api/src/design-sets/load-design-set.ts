import type { EntityManager } from '@mikro-orm/sqlite';
import { notFound } from '../common/problem.js';
import type { Study } from '../studies/study.entity.js';
import { DesignSet } from './design-set.entity.js';
import { Option } from './option.entity.js';

export interface LoadedDesignSet {
  designSet: DesignSet;
  /** In their order. */
  options: Option[];
  /** Last removed first. */
  removed: Option[];
}

/** A study's design set with its options. */
export async function loadDesignSet(em: EntityManager, study: Study): Promise<LoadedDesignSet> {
  const designSet = await em.findOne(DesignSet, { study }, { populate: ['chosenBy'] });
  if (!designSet) throw notFound('This study has no design set yet.');
  const place = ({ id }: Option) => designSet.optionIds.indexOf(id);
  const all = await em.find(
    Option,
    { designSet },
    { populate: ['ruledBy'], orderBy: { removedAt: 'desc', id: 'asc' } },
  );
  return {
    designSet,
    options: all.filter(({ removedAt }) => !removedAt).toSorted((a, b) => place(a) - place(b)),
    removed: all.filter(({ removedAt }) => removedAt),
  };
}

/** One of a study's options, as it stands or, where that is wished, removed. */
export async function loadOption(
  em: EntityManager,
  study: Study,
  id: string,
  { removed } = { removed: false },
): Promise<Option> {
  const option = await em.findOne(
    Option,
    { id, designSet: { study } },
    { populate: ['ruledBy', 'designSet'] },
  );
  if (!option) throw notFound('There is no such option in this study.');
  if (option.removedAt && !removed) throw notFound('This option has been removed. It can be restored.');
  return option;
}

import type { EntityManager } from '@mikro-orm/sqlite';
import { notFound } from '../common/problem.js';
import type { Study } from '../studies/study.entity.js';
import { DesignSet } from './design-set.entity.js';
import { Option } from './option.entity.js';

/** A study's design set with its options in their order. */
export async function loadDesignSet(em: EntityManager, study: Study) {
  const designSet = await em.findOne(DesignSet, { study });
  if (!designSet) throw notFound('This study has no design set yet.');
  const place = ({ id }: Option) => designSet.optionIds.indexOf(id);
  const options = await em.find(Option, { designSet });
  return { designSet, options: options.toSorted((a, b) => place(a) - place(b)) };
}

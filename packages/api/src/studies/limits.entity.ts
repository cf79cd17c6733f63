import { defineEntity, type InferEntity, p } from '@mikro-orm/sqlite';
import type { Limits as Figures } from '@steelyard/calc';
import { aggregateProperties } from '../common/base.entity.js';
import { Study } from './study.entity.js';

/** The most that exists of what a study's options take. */
export const Limits = defineEntity({
  name: 'Limits',
  properties: {
    ...aggregateProperties,
    study: () => p.oneToOne(Study),
    limits: p.json<Figures>(),
  },
});

export type Limits = InferEntity<typeof Limits>;

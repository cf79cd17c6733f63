import { EntityManager } from '@mikro-orm/sqlite';
import { type IQueryHandler, QueryHandler } from '@nestjs/cqrs';
import type { DesignSetView } from '../../contract/design-sets.js';
import { openStudy } from '../../studies/open-study.js';
import { designSetView } from '../design-set.view.js';
import { loadDesignSet } from '../load-design-set.js';
import { WhichOptions } from './which-options.query.js';

@QueryHandler(WhichOptions)
export class WhichOptionsHandler implements IQueryHandler<WhichOptions> {
  constructor(private readonly em: EntityManager) {}

  async execute(query: WhichOptions): Promise<DesignSetView> {
    const em = this.em.fork();
    const { study } = await openStudy(em, query);
    return designSetView(await loadDesignSet(em, study));
  }
}

import { EntityManager } from '@mikro-orm/sqlite';
import { type IQueryHandler, QueryHandler } from '@nestjs/cqrs';
import type { StudiesView } from '../../contract/studies.js';
import { DesignSet } from '../../design-sets/design-set.entity.js';
import { lastChanges } from '../last-changes.js';
import { Membership } from '../membership.entity.js';
import { studySummaryView } from '../study.view.js';
import { WhichStudies } from './which-studies.query.js';

@QueryHandler(WhichStudies)
export class WhichStudiesHandler implements IQueryHandler<WhichStudies> {
  constructor(private readonly em: EntityManager) {}

  async execute({ personId }: WhichStudies): Promise<StudiesView> {
    const em = this.em.fork();
    const memberships = await em.find(Membership, { person: personId }, { populate: ['study'] });
    const ids = memberships.map(({ study }) => study.id);
    const changes = await lastChanges(em, ids);
    const designSets = await em.find(DesignSet, { study: { $in: ids } });
    const options = new Map(designSets.map(({ study, optionIds }) => [study.id, optionIds.length]));
    const studies = memberships.map((membership) =>
      studySummaryView(membership, {
        options: options.get(membership.study.id) ?? 0,
        changedAt: changes.get(membership.study.id) ?? membership.study.changedAt,
      }),
    );
    return { studies: studies.toSorted((a, b) => b.changedAt.localeCompare(a.changedAt)) };
  }
}

import { EntityManager } from '@mikro-orm/sqlite';
import { type IQueryHandler, QueryHandler } from '@nestjs/cqrs';
import { letterOf } from '@steelyard/calc';
import type { StudiesView, StudySummary } from '../../contract/studies.js';
import { DesignSet } from '../../design-sets/design-set.entity.js';
import { Option } from '../../design-sets/option.entity.js';
import { lastChanges } from '../last-changes.js';
import { Membership } from '../membership.entity.js';
import { may } from '../permissions.js';
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
    const options = await em.find(Option, { designSet: { $in: designSets }, removedAt: null });
    const studies = memberships.map((membership) => {
      const designSet = designSets.find(({ study }) => study === membership.study);
      const own = options.filter((option) => option.designSet === designSet);
      return studySummaryView(membership, {
        options: own.length,
        choice: designSet && may(membership.role, 'see the draft') ? choiceOf(designSet, own) : null,
        changedAt: changes.get(membership.study.id) ?? membership.study.changedAt,
      });
    });
    return { studies: studies.toSorted((a, b) => b.changedAt.localeCompare(a.changedAt)) };
  }
}

function choiceOf({ optionIds, choice }: DesignSet, options: Option[]): StudySummary['choice'] {
  const inOrder = options.toSorted((a, b) => optionIds.indexOf(a.id) - optionIds.indexOf(b.id));
  const place = inOrder.findIndex(({ id }) => id === choice?.optionId);
  const chosen = inOrder[place];
  return chosen ? { letter: letterOf(place), name: chosen.name } : null;
}

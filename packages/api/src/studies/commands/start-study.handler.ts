import { EntityManager } from '@mikro-orm/sqlite';
import { CommandHandler, type ICommandHandler } from '@nestjs/cqrs';
import { recordAudit } from '../../audit/record-audit.js';
import { newAggregate } from '../../common/base.entity.js';
import { Clock } from '../../common/clock.js';
import { validated } from '../../common/validation.js';
import type { StudyView } from '../../contract/studies.js';
import { questionPlanOf, studyStartSchema } from '../../contract/study-start.js';
import { DesignSet } from '../../design-sets/design-set.entity.js';
import { Option } from '../../design-sets/option.entity.js';
import { Person } from '../../people/person.entity.js';
import { assumed, assumedCosts, assumedLedger, firstOption } from '../assumptions.js';
import { CostPlan } from '../cost-plan.entity.js';
import { Membership } from '../membership.entity.js';
import { PlanningValue } from '../planning-value.entity.js';
import { PlanningValueRevision } from '../planning-value-revision.entity.js';
import { readStudy } from '../read-study.js';
import { Study } from '../study.entity.js';
import { StartStudy } from './start-study.command.js';

@CommandHandler(StartStudy)
export class StartStudyHandler implements ICommandHandler<StartStudy> {
  constructor(
    private readonly em: EntityManager,
    private readonly clock: Clock,
  ) {}

  /** Alone of all commands it makes several aggregates: none of them is of use without the others. */
  execute({ personId, study: given }: StartStudy): Promise<StudyView> {
    const start = validated(studyStartSchema, given);
    const now = this.clock.now();
    return this.em.fork().transactional(async (em) => {
      const by = await em.findOneOrFail(Person, personId);
      const {
        name,
        organisation,
        question,
        outcome,
        participants,
        clusters,
        treatments,
        power = 0.9,
      } = start;
      const words = { name, organisation, question, participants, clusters, treatments };
      const study = em.create(Study, {
        ...newAggregate(now),
        ...words,
        outcomeLabel: outcome.label,
        outcomeUnit: outcome.unit,
        plan: questionPlanOf(start),
        fictional: false,
      });
      const membership = em.create(Membership, { study, person: by, role: 'methodologist' });
      for (const { key, value, source } of assumedLedger(start)) {
        const figures = { value, source, setBy: by };
        const planningValue = em.create(PlanningValue, {
          ...newAggregate(now),
          ...figures,
          study,
          key,
          scope: 'every-family',
        });
        em.create(PlanningValueRevision, { ...figures, planningValue, version: 1, setAt: now });
      }
      const costs = assumedCosts(start);
      em.create(CostPlan, { ...newAggregate(now), study, ...costs, source: assumed, setBy: by });
      const hold = { kind: 'power' as const, power };
      const designSet = em.create(DesignSet, { ...newAggregate(now), study, hold, optionIds: [] });
      const option = em.create(Option, { ...newAggregate(now), designSet, ...firstOption(start) });
      em.assign(designSet, { optionIds: [option.id] });
      recordAudit(em, { action: 'created', what: 'the study', after: start }, { at: now, by, study });
      await em.flush();
      return readStudy(em, membership);
    });
  }
}

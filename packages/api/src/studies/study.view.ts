import { type StudySummary, type StudyView, studyRoles } from '../contract/studies.js';
import type { Membership } from './membership.entity.js';
import { may } from './permissions.js';

export function studySummaryView(
  { study, role }: Membership,
  { options, choice, changedAt }: Pick<StudySummary, 'options' | 'choice'> & { changedAt: Date },
): StudySummary {
  return {
    id: study.id,
    name: study.name,
    organisation: study.organisation,
    question: study.question,
    fictional: study.fictional,
    role,
    mayOpen: may(role, 'see the draft'),
    options,
    choice,
    changedAt: changedAt.toISOString(),
  };
}

export function studyView(
  { study, role }: Membership,
  { memberships, changedAt }: { memberships: Membership[]; changedAt: Date },
): StudyView {
  return {
    id: study.id,
    version: study.version,
    name: study.name,
    organisation: study.organisation,
    fictional: study.fictional,
    question: study.question,
    outcomeLabel: study.outcomeLabel,
    outcomeUnit: study.outcomeUnit,
    plan: study.plan,
    basis: study.basis ?? null,
    estimand: study.estimand ?? null,
    treatments: study.treatments,
    participants: study.participants,
    clusters: study.clusters ?? null,
    role,
    members: memberships.map(memberView).toSorted(byRole),
    changedAt: changedAt.toISOString(),
  };
}

const memberView = ({ person, role }: Membership): StudyView['members'][number] => ({
  person: { id: person.id, name: person.name },
  role,
});

const byRole = (a: StudyView['members'][number], b: StudyView['members'][number]) =>
  studyRoles.indexOf(a.role) - studyRoles.indexOf(b.role) || a.person.name.localeCompare(b.person.name, 'en');

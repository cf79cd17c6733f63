import type { StudyRole } from '../contract/studies.js';

const rolesFor = {
  'see the draft': ['methodologist', 'investigator', 'reader'],
  'change the question': ['methodologist', 'investigator'],
  'set planning values': ['methodologist'],
  'set costs': ['methodologist', 'investigator'],
  'set limits': ['methodologist', 'investigator'],
  'edit options': ['methodologist', 'investigator'],
  'rule on options': ['methodologist'],
  'record the choice': ['methodologist'],
  'change the members': ['methodologist'],
} satisfies Record<string, StudyRole[]>;

export type StudyAction = keyof typeof rolesFor;

export function may(role: StudyRole, action: StudyAction): boolean {
  const roles: readonly StudyRole[] = rolesFor[action];
  return roles.includes(role);
}

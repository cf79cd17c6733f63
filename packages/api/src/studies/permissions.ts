import type { StudyRole } from '../contract/studies.js';

const rolesFor = {
  'see the draft': ['methodologist', 'investigator', 'reader'],
  'set planning values': ['methodologist'],
  'set costs': ['methodologist', 'investigator'],
  'edit options': ['methodologist', 'investigator'],
} satisfies Record<string, StudyRole[]>;

export type StudyAction = keyof typeof rolesFor;

export function may(role: StudyRole, action: StudyAction): boolean {
  const roles: readonly StudyRole[] = rolesFor[action];
  return roles.includes(role);
}

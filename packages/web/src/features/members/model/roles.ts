import { type StudyRole, studyRoles } from '@steelyard/api/contract/studies';
import { capitalised } from '../../../shared/format/lists';

/** What a member of each role may do. */
export const roleMeanings: Record<StudyRole, string> = {
  methodologist:
    'Changes everything in the study: planning values, rulings, the choice and its members included.',
  investigator:
    'Works on the question, costs, limits and options; planning values, rulings and the choice stay as they are.',
  funder: 'Sees what the team submits, never the draft.',
  reader: 'Sees the whole draft and changes nothing.',
};

/** “Investigator”, as a role stands on its own. */
export const roleName = (role: StudyRole): string => capitalised(role);

export const roleChoices = studyRoles.map((role) => ({
  value: role,
  label: `${roleName(role)}. ${roleMeanings[role]}`,
}));

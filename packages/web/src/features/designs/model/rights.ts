import type { StudyRole } from '@steelyard/api/contract/studies';

/** Who may add, change, resize and remove options, and set the hold and the limits. */
export const mayEdit = (role: StudyRole): boolean => role === 'methodologist' || role === 'investigator';

/** Who may rule options in or out and record the choice. */
export const mayDecide = (role: StudyRole): boolean => role === 'methodologist';

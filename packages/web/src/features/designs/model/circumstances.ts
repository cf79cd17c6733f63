import type { Suitability } from '../families/family-ui';

/** What a team says of its question before it picks a design; undefined while it does not know. */
export interface Circumstances {
  individuals?: boolean;
  reversible?: boolean;
  groups?: boolean;
  staged?: boolean;
}

export const circumstanceQuestions: Record<keyof Circumstances, { asks: string; says: string }> = {
  individuals: {
    asks: 'Can individuals be randomised?',
    says: 'Not where they share what is given, or where those beside them would have it too.',
  },
  reversible: {
    asks: 'Is the condition stable, and does the effect wear off?',
    says: 'Then each can be compared with themselves in another period.',
  },
  groups: {
    asks: 'Is the treatment given in groups?',
    says: 'Such as classes or a therapist’s group: members then come to resemble each other.',
  },
  staged: {
    asks: 'Is the rollout forced?',
    says: 'Everyone is to have it in the end, and it can only be brought in by stages.',
  },
};

/** Why what is known of the question speaks against a family; empty where nothing does. */
export function objections(
  { randomises, reversible, groups, staged }: Suitability,
  known: Circumstances,
): string[] {
  return [
    ...(randomises === 'individuals' && known.individuals === false
      ? ['Individuals cannot be randomised.']
      : []),
    ...(randomises === 'clusters' && known.individuals === true
      ? ['Individuals can be randomised, and whole clusters would take more participants.']
      : []),
    ...(reversible && known.reversible === false
      ? ['The effect stays or the condition changes, so a second period does not start like the first.']
      : []),
    ...(groups && known.groups === false ? ['Nobody is treated in groups.'] : []),
    ...(staged === true && known.staged === false ? ['Nothing forces a rollout by stages.'] : []),
    ...(staged === false && known.staged === true
      ? ['Everyone is to have the treatment in the end, so nobody stays without it.']
      : []),
  ];
}

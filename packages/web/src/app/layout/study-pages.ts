import { letterOf } from '@steelyard/calc';
import { useQuery } from '@tanstack/react-query';
import { useLocation, useParams } from 'react-router-dom';
import { designSetQuery } from '../../features/designs/api/design-set';
import { studyQuery } from '../../features/studies/api/studies';
import { paths } from '../paths';

export interface StudyPage {
  label: string;
  path: string;
  current: boolean;
}

export interface StudyPages {
  name: string;
  fictional: boolean;
  /** Where its name leads. */
  home: string;
  /** Where the study is made and weighed. */
  main: StudyPage[];
  /** Who is in it and what they did. */
  about: StudyPage[];
  workings: { id: string; letter: string; position: number; name: string; path: string; current: boolean }[];
}

/** The pages of a study as its side list, its menu and the trail name them; undefined until both are known. */
export function useStudyPages(studyId: string): StudyPages | undefined {
  const { pathname } = useLocation();
  const { optionId } = useParams();
  const { data: study } = useQuery(studyQuery(studyId));
  const { data: designSet } = useQuery(designSetQuery(studyId));
  if (!study || !designSet) return undefined;
  const page = (label: string, path: string): StudyPage => ({ label, path, current: pathname === path });
  return {
    name: study.name,
    fictional: study.fictional,
    home: paths.weigh(studyId),
    main: [
      page('Question', paths.question(studyId)),
      page('Ledger', paths.ledger(studyId)),
      page('Costs', paths.costs(studyId)),
      page('Weigh', paths.weigh(studyId)),
    ],
    about: [page('Members', paths.members(studyId)), page('History', paths.history(studyId))],
    workings: designSet.options.map(({ id, name }, position) => ({
      id,
      letter: letterOf(position),
      position,
      name,
      path: paths.working(studyId, id),
      current: id === optionId,
    })),
  };
}

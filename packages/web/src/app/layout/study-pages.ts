import { letterOf } from '@steelyard/calc';
import { useQuery } from '@tanstack/react-query';
import { useLocation, useParams } from 'react-router-dom';
import { designSetQuery } from '../../features/designs/api/design-set';
import { studyQuery } from '../../features/studies/api/studies';
import { paths } from '../paths';

export interface StudyPages {
  name: string;
  fictional: boolean;
  weigh: { path: string; current: boolean };
  workings: { id: string; letter: string; position: number; name: string; path: string; current: boolean }[];
}

/** The pages of a study as its side list, its menu and the trail name them; undefined until both are known. */
export function useStudyPages(studyId: string): StudyPages | undefined {
  const { pathname } = useLocation();
  const { optionId } = useParams();
  const { data: study } = useQuery(studyQuery(studyId));
  const { data: designSet } = useQuery(designSetQuery(studyId));
  if (!study || !designSet) return undefined;
  const weigh = paths.weigh(studyId);
  return {
    name: study.name,
    fictional: study.fictional,
    weigh: { path: weigh, current: pathname === weigh },
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

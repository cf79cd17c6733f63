import { letterOf } from '@steelyard/calc';
import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { useLocation, useParams } from 'react-router-dom';
import { designSetQuery } from '../../features/designs/api/design-set';
import { costsQuery, ledgerQuery, studyQuery } from '../../features/studies/api/studies';
import { type Progress, progressOf } from '../../features/studies/model/progress';
import { paths } from '../paths';

export interface StudyPage {
  label: string;
  path: string;
  current: boolean;
  /** How far it has got, where that can be told. */
  progress?: Progress | undefined;
}

export interface StudyWorking {
  id: string;
  letter: string;
  position: number;
  name: string;
  /** Ruled out, and outlined wherever its letter stands. */
  ruledOut: boolean;
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
  workings: StudyWorking[];
}

/** The pages of a study as its side list, its menu and the trail name them; undefined until both are known. */
export function useStudyPages(studyId: string): StudyPages | undefined {
  const { pathname } = useLocation();
  const { optionId } = useParams();
  const { data: study } = useQuery(studyQuery(studyId));
  const { data: designSet } = useQuery(designSetQuery(studyId));
  // The routes ask for these; what fails is told and asked for again where it is shown.
  const { data: ledger } = useQuery({ ...ledgerQuery(studyId), enabled: false });
  const { data: costs } = useQuery({ ...costsQuery(studyId), enabled: false });
  const progress = useMemo(
    () => study && designSet && ledger && costs && progressOf({ study, designSet, ledger, costs }),
    [study, designSet, ledger, costs],
  );
  if (!study || !designSet) return undefined;
  const page = (label: string, path: string, got?: Progress): StudyPage => ({
    label,
    path,
    current: pathname === path,
    progress: got,
  });
  return {
    name: study.name,
    fictional: study.fictional,
    home: paths.weigh(studyId),
    main: [
      page('Question', paths.question(studyId), progress?.question),
      page('Ledger', paths.ledger(studyId), progress?.ledger),
      page('Costs', paths.costs(studyId), progress?.costs),
      page('Weigh', paths.weigh(studyId), progress?.weigh),
    ],
    about: [page('Members', paths.members(studyId)), page('History', paths.history(studyId))],
    workings: designSet.options.map(({ id, name, ruling }, position) => ({
      id,
      letter: letterOf(position),
      position,
      name,
      ruledOut: ruling?.kind === 'not-admissible',
      path: paths.working(studyId, id),
      current: id === optionId,
    })),
  };
}

import type { DesignSetView, OptionView } from '@steelyard/api/contract/design-sets';
import type { ChangedOption, NewChoice, NewOption, NewRuling } from '@steelyard/api/contract/options';
import { api } from '../../../shared/api/client';

const optionsPath = (studyId: string) => `/studies/${studyId}/options`;
const optionPath = (studyId: string, optionId: string) => `${optionsPath(studyId)}/${optionId}`;

export const addOption = (studyId: string, body: NewOption) =>
  api.post<OptionView>(optionsPath(studyId), body);

export const changeOption = (studyId: string, optionId: string, body: ChangedOption) =>
  api.put<OptionView>(optionPath(studyId, optionId), body);

export const duplicateOption = (studyId: string, optionId: string) =>
  api.post<OptionView>(`${optionPath(studyId, optionId)}/duplicate`, {});

export const removeOption = (studyId: string, { id, version }: OptionView) =>
  api.delete(optionPath(studyId, id), { version });

export const restoreOption = (studyId: string, { id, version }: OptionView) =>
  api.post<OptionView>(`${optionPath(studyId, id)}/restore`, { version });

export const ruleOnOption = (studyId: string, optionId: string, body: NewRuling) =>
  api.put<OptionView>(`${optionPath(studyId, optionId)}/ruling`, body);

export const recordChoice = (studyId: string, body: NewChoice) =>
  api.put<DesignSetView>(`/studies/${studyId}/choice`, body);

export const withdrawChoice = (studyId: string, version: number) =>
  api.delete<DesignSetView>(`/studies/${studyId}/choice`, { version });

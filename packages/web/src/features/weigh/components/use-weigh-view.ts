import { useSearchParams } from 'react-router-dom';
import { acrossKinds, overKinds, upKinds } from '../../trade-off/model/axes';
import type { Choice } from '../../trade-off/model/picture';
import { type BeamMeasure, beamMeasures } from '../model/beam-measures';

/** How Weigh is being looked at: what a link to it shows. */
export interface WeighView extends Choice {
  /** The option chosen. */
  option: string | undefined;
  /** The option that the others are told against. */
  against: string | undefined;
  beams: BeamMeasure;
}

/** The view as the address has it, and a way to change parts of it; what is as usual is left out. */
export function useWeighView() {
  const [search, setSearch] = useSearchParams();
  const one = <Kind extends string>(key: string, kinds: readonly [Kind, ...Kind[]]): Kind =>
    kinds.find((kind) => kind === search.get(key)) ?? kinds[0];
  const view: WeighView = {
    option: search.get('option') ?? undefined,
    against: search.get('against') ?? undefined,
    beams: one('beams', beamMeasures),
    over: one('over', overKinds),
    across: one('across', acrossKinds),
    up: one('up', upKinds),
  };
  const show = (changes: Partial<WeighView>) =>
    setSearch(
      (now) => {
        const next = new URLSearchParams(now);
        for (const [key, value] of Object.entries(changes)) {
          if (value === undefined || value === usual[key]) next.delete(key);
          else next.set(key, value);
        }
        return next;
      },
      { replace: true },
    );
  return { view, show };
}

const usual: Record<string, string> = {
  beams: beamMeasures[0],
  over: overKinds[0],
  across: acrossKinds[0],
  up: upKinds[0],
};

import type { ChartHandle } from '../../../charts/keys';
import type { Weighing } from '../../weigh/model/weighing';
import { sizeInWords } from './finding';
import type { Picture } from './picture';
import { pointInWords, sizeNoun } from './sizes-table';

/** What the curves may run over. */
export function overChoices({ study }: Weighing) {
  const { one, many } = study.clusters ?? { one: 'cluster', many: 'clusters' };
  return [
    { kind: 'units' as const, label: study.clusters ? `number of ${many}` : 'number' },
    { kind: 'clusterSize' as const, label: `size of a ${one}` },
  ];
}

/** Each option’s marker as a control. */
export function handlesOf(picture: Picture, weighing: Weighing): ChartHandle[] {
  return picture.drawn.flatMap(({ option, curve: { from, to }, now }) =>
    now
      ? [
          {
            id: option.id,
            label: `${option.letter} ${option.name}, ${sizeNoun(option, picture).toLocaleLowerCase('en-GB')}`,
            valueText: sizeInWords(option, weighing),
            now: now.size,
            smallest: from,
            largest: to,
            page: Math.max(2, Math.round((to - from) / 12)),
          },
        ]
      : [],
  );
}

/** What a size of an option means, where its curve has a point. */
export function described(picture: Picture, weighing: Weighing, id: string, size: number): string[] {
  const drawn = picture.drawn.find(({ option }) => option.id === id);
  const point =
    drawn && (drawn.now?.size === size ? drawn.now : drawn.curve.points.find((each) => each.size === size));
  return drawn && point ? pointInWords(drawn.option, point, picture, weighing) : [];
}

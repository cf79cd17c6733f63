import { exactMoney } from '../../../shared/format/money';
import { count, months, power } from '../../../shared/format/numbers';
import { DataTable } from '../../../shared/ui/data-table';
import type { Weighing } from '../../weigh/model/weighing';
import type { Picture } from '../model/picture';
import { sizeNoun, sizeRows } from '../model/sizes-table';

/** The curves as figures: a few sizes of each option, and the one it has. */
export function SizesTable({ picture, weighing }: { picture: Picture; weighing: Weighing }) {
  const { up } = picture;
  const extra = up.kind === 'power' ? [] : [{ label: up.label, figures: true }];
  return (
    <DataTable
      label="Trade-off as a table"
      scrolls
      columns={[
        { label: 'Option' },
        { label: 'Size' },
        { label: 'Power', figures: true },
        ...extra,
        { label: 'Analysed', figures: true },
        { label: 'Cost', figures: true },
        { label: 'Months', figures: true },
        { label: 'Limits' },
      ]}
      rows={sizeRows(picture).map(({ option, point, now, within }) => {
        const { letter, name, id } = option;
        const value = up.of(point, option.request);
        const size = `${count(point.size)} ${sizeNoun(option, picture).toLocaleLowerCase('en-GB')}`;
        return {
          key: `${id} ${point.size}`,
          cells: [
            `${letter} ${name}`,
            now ? <strong>{size}, now</strong> : size,
            power(point.power),
            ...(up.kind === 'power' ? [] : [value === undefined ? '–' : up.tell(value)]),
            count(point.participants),
            point.cost === undefined ? '–' : exactMoney(point.cost, weighing.currency),
            point.months === undefined ? '–' : months(point.months),
            within ? 'within' : 'over',
          ],
        };
      })}
    />
  );
}

import { makeStyles } from '@fluentui/react-components';
import { DataTable } from '../../../shared/ui/data-table';
import { cellName, Schedule } from '../../designs/components/schedule';
import type { Schematic } from '../../designs/families/family-ui';

const useStyles = makeStyles({
  both: { display: 'flex', flexWrap: 'wrap', alignItems: 'center', gap: '12px 28px' },
  table: { flexGrow: 1, maxWidth: '560px', minWidth: 0 },
});

/** The schedule as a picture and as a table. */
export function ScheduleTable(props: { schematic: Schematic; arms: readonly string[]; hue: string }) {
  const styles = useStyles();
  const { schematic, arms, hue } = props;
  const { periods, sequences } = schematic;
  return (
    <div className={styles.both}>
      <Schedule schematic={schematic} arms={arms} hue={hue} width={96} height={54} />
      <div className={styles.table}>
        <DataTable
          label="Schedule"
          columns={[{ label: 'Randomised to' }, ...periods.map((label) => ({ label }))]}
          rows={sequences.map(({ name, cells }) => ({
            key: name,
            cells: [name, ...cells.map((cell) => cellName(cell, arms))],
          }))}
        />
      </div>
    </div>
  );
}

import { makeStyles, tokens } from '@fluentui/react-components';
import type { WeighedOption } from '@steelyard/calc';
import { list } from '../../../shared/format/lists';
import { exactMoney } from '../../../shared/format/money';
import { count, months, power } from '../../../shared/format/numbers';
import { DataTable } from '../../../shared/ui/data-table';
import { OptionTag } from '../../../shared/ui/option-tag';
import type { Effect } from '../model/effects';

const useStyles = makeStyles({
  effects: { display: 'grid', gridTemplateColumns: 'minmax(0, 1fr)', gap: '6px' },
  finding: { fontWeight: 700 },
  option: { display: 'flex', gap: '8px', alignItems: 'center' },
  was: { color: tokens.colorNeutralForeground2 },
  now: { fontWeight: 700 },
});

interface EffectsTableProps {
  label: string;
  effects: readonly Effect[];
  currency: string;
  /** Whether the change has been made already. */
  saved?: boolean;
}

const measures = (currency: string): { label: string; of: (option: WeighedOption) => string }[] => [
  { label: 'Recruited', of: figure(({ recruited }) => count(recruited)) },
  { label: 'Cost', of: figure(({ costs }) => (costs ? exactMoney(costs.total, currency) : 'not stated')) },
  { label: 'Months', of: figure(({ timeline }) => (timeline ? months(timeline.months) : 'not stated')) },
  { label: 'Power', of: figure((appraisal) => power(appraisal.power)) },
];

/** What a change does to every option: recruited, cost, months and power, before and after. */
export function EffectsTable({ label, effects, currency, saved }: EffectsTableProps) {
  const styles = useStyles();
  if (effects.length === 0) return <p>There are no options yet that it could change.</p>;
  const columns = measures(currency);
  const moved = effects.filter((effect) => columns.some(({ of }) => of(effect.before) !== of(effect.after)));
  return (
    <div className={styles.effects}>
      <p className={styles.finding} role="status">
        {finding(moved, effects, saved ?? false)}
      </p>
      {moved.length > 0 && (
        <DataTable
          label={label}
          scrolls
          columns={[{ label: 'Option' }, ...columns.map((column) => ({ ...column, figures: true }))]}
          rows={moved.map(({ position, before, after }) => ({
            key: before.id,
            cells: [
              <span key="option" className={styles.option}>
                <OptionTag letter={before.letter} position={position} small />
                {before.name}
              </span>,
              ...columns.map(({ label: measure, of }) => (
                <Moved key={measure} was={of(before)} now={of(after)} />
              )),
            ],
          }))}
        />
      )}
      {moved.flatMap(({ after }) => {
        const trouble = troubleOf(after);
        return trouble ? [<p key={after.id}>{`${after.letter}: ${trouble}`}</p>] : [];
      })}
    </div>
  );
}

function Moved({ was, now }: { was: string; now: string }) {
  const styles = useStyles();
  if (was === now) return <span className={styles.was}>{now}</span>;
  return (
    <>
      <span className={styles.was}>{was} → </span>
      <span className={styles.now}>{now}</span>
    </>
  );
}

function finding(moved: readonly Effect[], effects: readonly Effect[], saved: boolean): string {
  const letters = list(moved.map(({ before }) => before.letter));
  if (moved.length === 0) return saved ? 'Saved. No option moved.' : 'This moves no option.';
  if (moved.length === effects.length && moved.length > 1)
    return saved ? 'Saved. Every option moved:' : 'This moves every option:';
  return saved ? `Saved. ${letters} moved:` : `This moves ${letters}:`;
}

function troubleOf({ appraisal, error }: WeighedOption): string | undefined {
  if (error) return error.message;
  return appraisal?.feasible === false ? appraisal.infeasible.message : undefined;
}

type Feasible = Extract<NonNullable<WeighedOption['appraisal']>, { feasible: true }>;

const figure =
  (of: (appraisal: Feasible) => string) =>
  ({ appraisal }: WeighedOption): string =>
    appraisal?.feasible ? of(appraisal) : 'none';

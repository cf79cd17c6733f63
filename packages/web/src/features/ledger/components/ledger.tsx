import { Button, Field, makeStyles, Select, tokens } from '@fluentui/react-components';
import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { capitalised, counted } from '../../../shared/format/lists';
import { Skeleton, SkeletonItem } from '../../../shared/ui/skeleton';
import { sessionQuery } from '../../access/api/access';
import { mayDecide } from '../../designs/model/rights';
import { useStored } from '../../studies/api/use-stored';
import { EffectsTable } from '../../studies/components/effects-table';
import { toReplace } from '../../studies/model/assumed';
import type { Effect } from '../../studies/model/effects';
import { editKey, useKeptEdits } from '../../unsaved/model/kept-edits';
import { apartFrom, type Line, linesOf } from '../model/lines';
import { LedgerLine } from './ledger-line';
import { LineForm } from './line-form';
import { RemoveLine } from './remove-line';

const useStyles = makeStyles({
  list: { display: 'grid', gridTemplateColumns: 'minmax(0, 1fr)', gap: '10px', marginTop: '12px' },
  // The longest of its choices does not decide its width.
  apart: { gridTemplateColumns: 'minmax(0, 1fr)', marginTop: '20px', maxWidth: '420px' },
  told: { color: tokens.colorNeutralForeground2, maxWidth: '72ch' },
  skeleton: { display: 'grid', gap: '10px' },
});

/** Every planning value of a study; the methodologist sets them in place. */
export function Ledger({ studyId }: { studyId: string }) {
  const styles = useStyles();
  const stored = useStored(studyId);
  const { study, ledger, designSet, costs } = stored;
  const edits = useKeptEdits((kept) => kept.edits);
  const personId = useQuery(sessionQuery()).data?.id ?? '';
  const [moved, setMoved] = useState<{ lineId: string; effects: Effect[] }>();
  const begunOn = ({ id }: Line) => editKey(personId, `${studyId}/planning-value/${id}`) in edits;

  const may = mayDecide(study.role);
  const plans = designSet.options.map(({ plan }) => plan);
  const apart = apartFrom(study, ledger, plans);
  const usual = linesOf(study, ledger, plans);
  const [open, setOpen] = useState<string | undefined>(() => [...usual, ...apart].find(begunOn)?.id);
  const lines = [...usual, ...apart.filter((line) => line.id === open || begunOn(line))];
  const assumed = lines.filter((line) => line.assumed).length;

  const actionsOn = (line: Line) => {
    if (!may || line.id === open) return null;
    const begun = begunOn(line);
    const verb = begun ? 'Go on with my unsaved change' : line.stored ? 'Change' : 'State';
    return (
      <>
        <Button
          aria-label={begun ? `${verb} of ${line.label}` : `${verb} ${line.label}`}
          onClick={() => {
            setMoved(undefined);
            setOpen(line.id);
          }}
        >
          {verb}
        </Button>
        {line.family && line.stored && (
          <RemoveLine
            studyId={studyId}
            line={{ ...line, stored: line.stored }}
            stored={stored}
            onRemoved={(effects) => setMoved({ lineId: '', effects })}
          />
        )}
      </>
    );
  };
  const outcomeOf = ({ effects }: { effects: Effect[] }) => (
    <EffectsTable
      label="Options before and after the change"
      effects={effects}
      currency={costs.costs.currency}
      saved
    />
  );

  return (
    <>
      <p className={styles.told}>
        {assumed > 0 &&
          `${capitalised(counted(assumed, 'value says', 'values say'))} “${toReplace}”: put what you know in ${assumed === 1 ? 'its' : 'their'} place. `}
        {may
          ? 'A change moves every option that draws on the value; you see how before you save.'
          : 'The methodologist of the study sets these values.'}
      </p>
      {moved?.lineId === '' && outcomeOf(moved)}
      {lines.length === 0 && (
        <p>There are no planning values yet: they come with the first option on Weigh.</p>
      )}
      <ul className={styles.list} aria-label="Planning values">
        {lines.map((line) => (
          <LedgerLine
            key={line.id}
            study={study}
            line={line}
            actions={actionsOn(line)}
            outcome={moved?.lineId === line.id ? outcomeOf(moved) : null}
            form={
              may && line.id === open ? (
                <LineForm
                  studyId={studyId}
                  line={line}
                  stored={stored}
                  onClose={() => setOpen(undefined)}
                  onSaved={(effects) => setMoved({ lineId: line.id, effects })}
                />
              ) : null
            }
          />
        ))}
      </ul>
      {may && apart.length > 0 && (
        <Field
          className={styles.apart}
          label="A value for one family of designs"
          hint="Such as more attrition in crossover designs, which ask more of people."
        >
          <Select
            value={apart.some(({ id }) => id === open) ? open : ''}
            onChange={(_, { value }) => setOpen(value)}
          >
            <option value="">Choose one</option>
            {apart.map(({ id, label }) => (
              <option key={id} value={id}>
                {label}
              </option>
            ))}
          </Select>
        </Field>
      )}
    </>
  );
}

export function LedgerSkeleton() {
  const styles = useStyles();
  return (
    <Skeleton aria-label="Loading the ledger" className={styles.skeleton}>
      <SkeletonItem size={96} />
      <SkeletonItem size={96} />
      <SkeletonItem size={96} />
    </Skeleton>
  );
}

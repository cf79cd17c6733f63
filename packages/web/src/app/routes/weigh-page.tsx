import { Button, makeStyles, mergeClasses } from '@fluentui/react-components';
import { useState } from 'react';
import { useParams, useSearchParams } from 'react-router-dom';
import { mayDecide, mayEdit } from '../../features/designs/model/rights';
import { AddOptionDialog } from '../../features/options/components/add-option-dialog';
import { Choice } from '../../features/options/components/choice';
import { ChoiceDialog } from '../../features/options/components/choice-dialog';
import { OptionActions } from '../../features/options/components/option-actions';
import { OptionForm } from '../../features/options/components/option-form';
import { RemovedOptions } from '../../features/options/components/removed-options';
import { Ruling } from '../../features/options/components/ruling';
import { useWeighing } from '../../features/weigh/api/use-weighing';
import { BeamsCard } from '../../features/weigh/components/beams-card';
import { HoldAndLimits } from '../../features/weigh/components/hold-and-limits';
import { OptionPanel } from '../../features/weigh/components/option-panel';
import { OptionSheet } from '../../features/weigh/components/option-sheet';
import { WeighHead } from '../../features/weigh/components/weigh-head';
import { WeighSkeleton } from '../../features/weigh/components/weigh-skeleton';
import type { Weighed } from '../../features/weigh/model/weighing';
import { usePreferences } from '../../shared/preferences';
import { QueryBoundary } from '../../shared/ui/query-boundary';
import { narrow, useMedia } from '../../shared/ui/use-media';
import { paths } from '../paths';

const wide = '@media (min-width: 1280px)';

const useStyles = makeStyles({
  columns: {
    minHeight: '100%',
    [wide]: { display: 'grid', gridTemplateColumns: 'minmax(0, 1fr) 344px' },
    '@media print': { display: 'block' },
  },
  folded: { [wide]: { gridTemplateColumns: 'minmax(0, 1fr) 44px' } },
  scale: {
    minWidth: 0,
    padding: '16px 18px 24px',
    '@media (max-width: 640px)': { padding: '12px' },
  },
});

export function WeighPage() {
  const { studyId = '' } = useParams();
  return (
    <QueryBoundary key={studyId} what="study" wholePage skeleton={<WeighSkeleton />}>
      <Weigh studyId={studyId} />
    </QueryBoundary>
  );
}

function Weigh({ studyId }: { studyId: string }) {
  const styles = useStyles();
  const weighing = useWeighing(studyId);
  const [search, setSearch] = useSearchParams();
  const small = useMedia(narrow);
  const folded = usePreferences((preferences) => preferences.panelFolded);

  const chosen = weighing.options.find(({ id }) => id === search.get('option'));
  const selected = chosen ?? (small ? undefined : weighing.options[0]);
  const select = (option?: string) =>
    setSearch(option ? { option } : {}, { replace: true, preventScrollReset: true });
  const [asking, setAsking] = useState<'option' | 'choice'>();
  const { study, designSet } = weighing;
  const shown = (option: Weighed) => ({
    option,
    weighing,
    workingHref: paths.working(studyId, option.id),
    ruling: <Ruling studyId={studyId} option={option.stored} mayRule={mayDecide(study.role)} />,
    form: mayEdit(study.role) ? (
      <OptionForm key={option.id} option={option} weighing={weighing} />
    ) : undefined,
    actions: mayEdit(study.role) ? (
      <OptionActions option={option} weighing={weighing} onSelect={select} />
    ) : undefined,
  });
  const mayChoose = mayDecide(study.role) && !designSet.choice && weighing.options.length > 0;

  return (
    <div className={mergeClasses(styles.columns, folded && styles.folded)}>
      <title>{`Weigh · ${weighing.study.name} · Steelyard`}</title>
      <div className={styles.scale}>
        <WeighHead
          weighing={weighing}
          action={mayChoose && <Button onClick={() => setAsking('choice')}>Record the choice</Button>}
        >
          <HoldAndLimits weighing={weighing} onAdd={() => setAsking('option')} />
        </WeighHead>
        {weighing.options.length > 0 && (
          <BeamsCard weighing={weighing} selected={selected?.id} onSelect={select} />
        )}
        {mayEdit(study.role) && <RemovedOptions weighing={weighing} />}
        <Choice weighing={weighing} onChange={() => setAsking('choice')} />
      </div>
      {selected &&
        (small ? (
          <OptionSheet {...shown(selected)} onClose={() => select()} />
        ) : (
          <OptionPanel {...shown(selected)} />
        ))}
      {asking === 'option' && (
        <AddOptionDialog
          study={study}
          taken={weighing.options.map(({ name }) => name)}
          onAdded={select}
          onClose={() => setAsking(undefined)}
        />
      )}
      {asking === 'choice' && <ChoiceDialog weighing={weighing} onClose={() => setAsking(undefined)} />}
    </div>
  );
}

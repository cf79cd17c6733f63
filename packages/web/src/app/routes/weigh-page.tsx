import { Button, makeStyles, mergeClasses } from '@fluentui/react-components';
import { Suspense, useDeferredValue, useMemo, useState } from 'react';
import { useLocation, useParams } from 'react-router-dom';
import { mayDecide, mayEdit } from '../../features/designs/model/rights';
import { Choice } from '../../features/options/components/choice';
import { OptionActions } from '../../features/options/components/option-actions';
import { OptionEditing } from '../../features/options/components/option-editing';
import { RemovedOptions } from '../../features/options/components/removed-options';
import { Ruling } from '../../features/options/components/ruling';
import { TradeOff } from '../../features/trade-off/components/trade-off';
import { useWeighing } from '../../features/weigh/api/use-weighing';
import { BeamsCard } from '../../features/weigh/components/beams-card';
import { HoldAndLimits } from '../../features/weigh/components/hold-and-limits';
import { OptionBar } from '../../features/weigh/components/option-bar';
import { OptionDetails } from '../../features/weigh/components/option-details';
import { OptionLooks } from '../../features/weigh/components/option-looks';
import { OptionPanel } from '../../features/weigh/components/option-panel';
import { OptionSheet } from '../../features/weigh/components/option-sheet';
import { useWeighView } from '../../features/weigh/components/use-weigh-view';
import { WeighHead } from '../../features/weigh/components/weigh-head';
import { WeighSkeleton } from '../../features/weigh/components/weigh-skeleton';
import type { Weighed } from '../../features/weigh/model/weighing';
import { usePreferences } from '../../shared/preferences';
import { lazily } from '../../shared/ui/lazily';
import { QueryBoundary } from '../../shared/ui/query-boundary';
import { narrow, useMedia } from '../../shared/ui/use-media';
import { paths } from '../paths';

const AddOptionDialog = lazily(
  async () => (await import('../../features/options/components/add-option-dialog')).AddOptionDialog,
);
const ChoiceDialog = lazily(
  async () => (await import('../../features/options/components/choice-dialog')).ChoiceDialog,
);

const wide = '@media (min-width: 1280px)';
const widest = '@media (min-width: 1760px)';

const useStyles = makeStyles({
  columns: {
    minHeight: '100%',
    [wide]: { display: 'grid', gridTemplateColumns: 'minmax(0, 1fr) 328px' },
    [widest]: { gridTemplateColumns: 'minmax(0, 1fr) 420px' },
    '@media print': { display: 'block', minHeight: 0, page: 'weigh' },
  },
  folded: {
    [wide]: { gridTemplateColumns: 'minmax(0, 1fr) 44px' },
    [widest]: { gridTemplateColumns: 'minmax(0, 1fr) 44px' },
  },
  scale: {
    minWidth: 0,
    padding: '16px 18px 24px',
    '@media (max-width: 640px)': { padding: '12px' },
    [widest]: { padding: '20px 28px 32px' },
    // Verdict, limits, beams, canvas and choice on one sheet of paper.
    '@media print': { padding: 0, zoom: '0.8' },
  },
  crowded: { '@media print': { zoom: '0.7' } },
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
  const { view, show } = useWeighView();
  const small = useMedia(narrow);
  const folded = usePreferences((preferences) => preferences.panelFolded);

  // While sizes are tried out, verdict, beams and canvas go before the panel.
  const before = useDeferredValue(weighing);
  const settled = weighing.sizing ? before : weighing;
  const chosen = weighing.options.find(({ id }) => id === view.option);
  const selected = chosen ?? (small ? undefined : weighing.options[0]);
  const select = (option?: string) => show({ option });
  const [asking, setAsking] = useState<'option' | 'choice'>();
  const { study, designSet } = weighing;
  const shown = (option: Weighed) => {
    const looks = (
      <OptionLooks option={option} weighing={settled} workingHref={paths.working(studyId, option.id)} />
    );
    return {
      option,
      weighing: settled,
      ruling: <Ruling studyId={studyId} option={option.stored} mayRule={mayDecide(study.role)} />,
      details: mayEdit(study.role) ? (
        <OptionEditing
          key={option.id}
          option={option}
          weighing={settled}
          looks={looks}
          actions={<OptionActions option={option} weighing={settled} onSelect={select} />}
        />
      ) : (
        <>
          <OptionDetails option={option} weighing={settled} />
          <OptionBar looks={looks} />
        </>
      ),
    };
  };
  const option = settled.options.find(({ id }) => id === selected?.id) ?? selected;
  const { search } = useLocation();
  const panel = useMemo(
    () =>
      option &&
      (small ? (
        <OptionSheet {...shown(option)} onClose={() => select()} />
      ) : (
        <OptionPanel {...shown(option)} />
      )),
    [option, settled, small, search],
  );
  const held = useMemo(
    () => <HoldAndLimits weighing={settled} onAdd={() => setAsking('option')} />,
    [settled],
  );
  const removed = useMemo(
    () => mayEdit(settled.study.role) && <RemovedOptions weighing={settled} />,
    [settled],
  );
  const choice = useMemo(() => <Choice weighing={settled} onChange={() => setAsking('choice')} />, [settled]);
  const mayChoose = mayDecide(study.role) && !designSet.choice && weighing.options.length > 0;

  return (
    <div className={mergeClasses(styles.columns, folded && styles.folded)}>
      <title>{`Weigh · ${weighing.study.name} · Steelyard`}</title>
      <div className={mergeClasses(styles.scale, weighing.options.length > 4 && styles.crowded)}>
        <WeighHead
          weighing={weighing}
          action={mayChoose && <Button onClick={() => setAsking('choice')}>Record the choice</Button>}
        >
          {held}
        </WeighHead>
        {weighing.options.length > 0 && (
          <BeamsCard weighing={weighing} selected={selected?.id} onSelect={select} />
        )}
        {removed}
        <TradeOff weighing={weighing} selected={selected?.id} onSelect={select} />
        {choice}
      </div>
      {panel}
      <Suspense>
        {asking === 'option' && (
          <AddOptionDialog
            study={study}
            taken={weighing.options.map(({ name }) => name)}
            onAdded={select}
            onClose={() => setAsking(undefined)}
          />
        )}
        {asking === 'choice' && <ChoiceDialog weighing={weighing} onClose={() => setAsking(undefined)} />}
      </Suspense>
    </div>
  );
}

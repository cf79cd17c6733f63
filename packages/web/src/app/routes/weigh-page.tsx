import { makeStyles, mergeClasses } from '@fluentui/react-components';
import { useParams, useSearchParams } from 'react-router-dom';
import { useWeighing } from '../../features/weigh/api/use-weighing';
import { BeamsCard } from '../../features/weigh/components/beams-card';
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
  const shown = (option: Weighed) => ({ option, weighing, workingHref: paths.working(studyId, option.id) });

  return (
    <div className={mergeClasses(styles.columns, folded && styles.folded)}>
      <title>{`Weigh · ${weighing.study.name} · Steelyard`}</title>
      <div className={styles.scale}>
        <WeighHead weighing={weighing} />
        {weighing.options.length > 0 && (
          <BeamsCard weighing={weighing} selected={selected?.id} onSelect={select} />
        )}
      </div>
      {selected &&
        (small ? (
          <OptionSheet {...shown(selected)} onClose={() => select()} />
        ) : (
          <OptionPanel {...shown(selected)} />
        ))}
    </div>
  );
}

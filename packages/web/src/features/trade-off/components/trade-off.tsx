import { Button, makeStyles, tokens } from '@fluentui/react-components';
import { useQuery } from '@tanstack/react-query';
import { useEffect, useMemo, useRef, useState } from 'react';
import { CanvasChart } from '../../../charts/canvas-chart';
import type { Scene } from '../../../charts/scene/marks';
import { ownTokens } from '../../../shared/ui/own-tokens';
import { usePalette } from '../../../shared/ui/palette';
import { narrow, useMedia } from '../../../shared/ui/use-media';
import { Word } from '../../../shared/ui/words';
import { sessionQuery } from '../../access/api/access';
import { resize } from '../../designs/model/drafts-of-sizes';
import { mayEdit } from '../../designs/model/rights';
import { useWeighView } from '../../weigh/components/use-weigh-view';
import type { Weighed, Weighing } from '../../weigh/model/weighing';
import type { KnownCurves } from '../model/curves';
import { finding, moveInWords, notes } from '../model/finding';
import { described, handlesOf, overChoices } from '../model/handles';
import { pictureOf } from '../model/picture';
import { AxisSelect } from './axis-select';
import { Exports } from './exports';
import { SizesBar } from './sizes-bar';
import { SizesTable } from './sizes-table';
import { useAnnouncement } from './use-announcement';

const useStyles = makeStyles({
  card: {
    marginTop: '10px',
    border: `1px solid ${tokens.colorNeutralStroke2}`,
    borderRadius: '10px',
    backgroundColor: tokens.colorNeutralBackground1,
    '@media print': { breakInside: 'avoid' },
  },
  head: { display: 'flex', flexWrap: 'wrap', alignItems: 'center', gap: '6px 12px', padding: '8px 14px' },
  title: { fontSize: '14px', lineHeight: '20px', fontWeight: 700 },
  how: {
    flex: '1 1 200px',
    minWidth: 0,
    color: tokens.colorNeutralForeground2,
    fontSize: '13px',
    lineHeight: '18px',
    '@media print': { display: 'none' },
  },
  axes: {
    display: 'flex',
    flexWrap: 'wrap',
    alignItems: 'center',
    gap: '6px 10px',
    '@media print': { display: 'none' },
  },
  toggle: { fontWeight: 400 },
  picture: { padding: '4px 14px 6px', '@media (max-width: 640px)': { padding: '4px 8px 6px' } },
  foot: {
    display: 'flex',
    flexWrap: 'wrap',
    alignItems: 'center',
    justifyContent: 'space-between',
    gap: '4px 16px',
    padding: '8px 14px',
    borderTop: `1px solid ${tokens.colorNeutralStroke2}`,
    color: tokens.colorNeutralForeground2,
    fontSize: '13px',
    lineHeight: '18px',
  },
  words: { flex: '1 1 320px', minWidth: 0, overflowWrap: 'anywhere' },
  finding: { color: tokens.colorNeutralForeground1 },
  swatch: {
    display: 'inline-block',
    width: '22px',
    height: '8px',
    marginRight: '6px',
    borderRadius: '4px',
    verticalAlign: '1px',
    backgroundColor: `color-mix(in srgb, ${tokens.colorBrandForeground1} 24%, ${ownTokens.brassSoft})`,
    printColorAdjust: 'exact',
  },
  empty: { padding: '24px 14px', color: tokens.colorNeutralForeground2 },
  spoken: {
    position: 'absolute',
    width: '1px',
    height: '1px',
    overflow: 'hidden',
    clipPath: 'inset(50%)',
    whiteSpace: 'nowrap',
  },
});

interface TradeOffProps {
  weighing: Weighing;
  selected: string | undefined;
  onSelect: (optionId: string) => void;
}

/** How long after a key or a drag another one still belongs to the same move. */
const oneMove = 1500;

/** Every option as a curve over its size, on axes of one's choice: the picture people decide from. */
export function TradeOff({ weighing, selected, onSelect }: TradeOffProps) {
  const styles = useStyles();
  const palette = usePalette();
  const small = useMedia(narrow);
  const { view, show } = useWeighView();
  const personId = useQuery(sessionQuery()).data?.id ?? '';
  const [asTable, setAsTable] = useState(false);
  const [move, setMove] = useState<{ before: Weighed; at: number }>();
  const [known] = useState<KnownCurves>(() => new Map());
  const scene = useRef<Scene>(null);
  const card = useRef<HTMLElement>(null);
  const lastMoved = useRef('');

  const { study, options } = weighing;
  const { over, across: asAcross, up: asUp } = view;
  const picture = useMemo(
    () => pictureOf(weighing, { over, across: asAcross, up: asUp }, selected, known),
    [weighing, over, asAcross, asUp, selected, known],
  );
  const { across, up, asked, choices, drawn, data } = picture;
  const moved = move && options.find(({ id }) => id === move.before.id);
  const says = moved && move ? moveInWords(move.before, moved, weighing) : finding(weighing, picture);
  const spoken = useAnnouncement(says);
  const optionOf = (id: string) => options.find((option) => option.id === id);

  // Another study's or a stored change is no move of this person's.
  useEffect(() => {
    if (!weighing.sizing) setMove(undefined);
  }, [weighing.sizing]);

  const grasp = (id: string) => {
    const before = optionOf(id);
    lastMoved.current = id;
    if (!before) return;
    const now = performance.now();
    setMove((last) =>
      last?.before.id === id && now - last.at < oneMove ? { ...last, at: now } : { before, at: now },
    );
  };
  const done = () => {
    setMove(undefined);
    // The button that was pressed goes with the bar.
    const last = lastMoved.current && `="${lastMoved.current}"`;
    card.current?.querySelector<HTMLElement>(`[data-option${last}]`)?.focus();
  };

  if (options.length === 0) {
    return (
      <section aria-label="Trade-off" className={styles.card}>
        <p className={styles.empty}>Add an option to see what each of its sizes costs and gives.</p>
      </section>
    );
  }
  const movable = mayEdit(study.role);
  return (
    <section ref={card} aria-label="Trade-off" className={styles.card}>
      <div className={styles.head}>
        <h2 className={styles.title}>
          <Word is="tradeOff">Trade-off</Word>
        </h2>
        <p className={styles.how}>
          {movable &&
            !small &&
            'Each curve is one option over its size; drag a marker, or use the arrow keys.'}
        </p>
        <div className={styles.axes}>
          {choices.over && (
            <AxisSelect
              label="over"
              value={asked.over}
              choices={overChoices(weighing)}
              onChange={(kind) => show({ over: kind })}
            />
          )}
          <AxisSelect
            label="across"
            value={across.kind}
            choices={choices.across}
            onChange={(kind) => show({ across: kind })}
          />
          <AxisSelect
            label="up"
            value={up.kind}
            choices={choices.up}
            onChange={(kind) => show({ up: kind })}
          />
          <Button
            size="small"
            shape="circular"
            className={styles.toggle}
            aria-label="Table of the trade-off"
            aria-pressed={asTable}
            onClick={() => setAsTable(!asTable)}
          >
            Table
          </Button>
        </div>
      </div>
      <div className={styles.picture}>
        {drawn.length === 0 ? (
          <p className={styles.empty}>No option can be drawn as it stands; what each lacks is said below.</p>
        ) : asTable ? (
          <SizesTable picture={picture} weighing={weighing} />
        ) : (
          <CanvasChart
            key={`${asked.over} ${across.kind} ${up.kind}`}
            label={`${up.label} over ${across.label.toLocaleLowerCase('en-GB')}`}
            data={data}
            colours={palette}
            height={heightOf}
            handles={handlesOf(picture, weighing)}
            movable={movable}
            describe={(id, size) => described(picture, weighing, id, size)}
            onGrasp={grasp}
            onMove={(id, size) => resize(personId, weighing, id, { [asked.over]: size })}
            onRelease={(id) => !small && id !== selected && onSelect(id)}
            onChoose={(id) => !small && onSelect(id)}
            scene={scene}
          />
        )}
      </div>
      <div className={styles.foot}>
        <div className={styles.words}>
          <p className={styles.finding}>{says}</p>
          {notes(weighing, picture).map((note) => (
            <p key={note}>{note}</p>
          ))}
          {data.front.length > 0 && !asTable && (
            <p>
              <span className={styles.swatch} />
              Pareto front: no other size within the limits gives{' '}
              {up.kind === 'power' ? 'more power' : 'a better figure'} for as little.
            </p>
          )}
        </div>
        {drawn.length > 0 && (
          <Exports
            name={`${study.name.toLocaleLowerCase('en-GB').replaceAll(/[^\p{L}\p{N}]+/gu, '-')}-trade-off`}
            title={`${study.name}: ${up.label} over ${across.label}`}
            finding={says}
            scene={() => scene.current}
            csv={async () => (await import('../model/sizes-csv')).sizesCsv(picture, weighing)}
          />
        )}
      </div>
      <SizesBar weighing={weighing} personId={personId} onDone={done} />
      <p role="status" className={styles.spoken}>
        {spoken}
      </p>
    </section>
  );
}

const heightOf = (width: number): number => Math.round(Math.min(480, Math.max(270, 0.36 * width)));

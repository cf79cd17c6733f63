import { Button, makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import {
  type KeyboardEvent,
  type PointerEvent,
  type RefObject,
  useEffect,
  useLayoutEffect,
  useMemo,
  useRef,
  useState,
} from 'react';
import { flushSync } from 'react-dom';
import { paint } from './draw/paint';
import { type ChartHandle, sizeByKey } from './keys';
import { besides, placeIn } from './pointer';
import { type ChartData, type Look, wholeView } from './scene/chart-data';
import { curveScene } from './scene/curve-scene';
import { type Found, finderOf, sizeNear } from './scene/hit-test';
import type { Place, Scene } from './scene/marks';
import { textMeasure } from './text-measure';
import type { Zoomer } from './zoom';

const font = 'Lato, system-ui, sans-serif';
const reach = 16;

const useStyles = makeStyles({
  chart: { position: 'relative', minWidth: 0 },
  canvas: {
    display: 'block',
    width: '100%',
    touchAction: 'pan-y',
    '@media print': { height: 'auto' },
  },
  zoomed: { touchAction: 'none', cursor: 'grab' },
  handle: {
    position: 'absolute',
    width: `${2 * reach}px`,
    height: `${2 * reach}px`,
    marginLeft: `-${reach}px`,
    marginTop: `-${reach}px`,
    borderRadius: '50%',
    cursor: 'default',
    outlineStyle: 'none',
    ':focus-visible': { outline: `2px solid ${tokens.colorStrokeFocus2}`, outlineOffset: '-1px' },
    '@media print': { display: 'none' },
  },
  movable: { touchAction: 'none', cursor: 'grab', ':active': { cursor: 'grabbing' } },
  dot: {
    position: 'absolute',
    width: '9px',
    height: '9px',
    margin: '-4.5px 0 0 -4.5px',
    borderRadius: '50%',
    border: `2px solid ${tokens.colorNeutralForeground1}`,
    backgroundColor: tokens.colorNeutralBackground1,
    pointerEvents: 'none',
  },
  tip: {
    position: 'absolute',
    zIndex: 2,
    maxWidth: '250px',
    padding: '6px 10px',
    border: `1px solid ${tokens.colorNeutralStroke1}`,
    borderRadius: '8px',
    backgroundColor: tokens.colorNeutralBackground1,
    boxShadow: tokens.shadow8,
    fontSize: '13px',
    lineHeight: '18px',
    overflowWrap: 'anywhere',
    pointerEvents: 'none',
    '& > :first-child': { fontWeight: 700 },
    '@media print': { display: 'none' },
  },
  tools: {
    position: 'absolute',
    right: '12px',
    top: '-2px',
    display: 'flex',
    gap: '4px',
    '@media print': { display: 'none' },
  },
  tool: { minWidth: '26px', padding: '0 6px', fontWeight: 400 },
});

interface CanvasChartProps {
  /** What the picture shows, for those who do not see it. */
  label: string;
  data: ChartData;
  colours: Look['colours'];
  height: (width: number) => number;
  handles: readonly ChartHandle[];
  /** Whether markers may be moved; otherwise they only tell what they stand for. */
  movable: boolean;
  /** What a size of an option means, line by line. */
  describe: (id: string, size: number) => readonly string[];
  onMove: (id: string, size: number) => void;
  /** A movement begins, or ends. */
  onGrasp: (id: string) => void;
  onRelease: (id: string) => void;
  onChoose: (id: string) => void;
  /** The picture as it is drawn now, for saving it. */
  scene: RefObject<Scene | null>;
}

/** A scene on a canvas, with a control over each marker, tips where the pointer is, zoom and pan. */
export function CanvasChart(props: CanvasChartProps) {
  const { label, data, colours, handles, movable, describe, onMove, onChoose } = props;
  const styles = useStyles();
  const root = useRef<HTMLDivElement>(null);
  const canvas = useRef<HTMLCanvasElement>(null);
  const zoomer = useRef<Promise<Zoomer>>(null);
  const [width, setWidth] = useState(720);
  const [fonts, setFonts] = useState(0);
  const [view, setView] = useState(wholeView);
  const [hovered, setHovered] = useState<Found>();
  const [shown, setShown] = useState<string>();
  const drag = useRef<{ id: string; offset: Place; at: Place; frame: number; moved: boolean }>(null);

  const height = props.height(width);
  const look = useMemo(() => ({ colours, font, measure: textMeasure(font, fonts) }), [colours, fonts]);
  const scene = useMemo(
    () => curveScene(data, { width, height }, look, view),
    [data, width, height, look, view],
  );
  const finder = useMemo(() => finderOf(scene), [scene]);

  useLayoutEffect(() => {
    props.scene.current = scene;
    if (canvas.current) paint(canvas.current, scene);
  }, [scene, props.scene]);

  useLayoutEffect(() => {
    const element = root.current;
    if (!element) return;
    const measure = () => setWidth(Math.round(element.clientWidth) || 720);
    measure();
    const observer = new ResizeObserver(measure);
    observer.observe(element);
    return () => observer.disconnect();
  }, []);

  useEffect(() => {
    // Text is measured and drawn anew once the typeface is there.
    void document.fonts
      ?.load(`13px ${font}`)
      .then(() => Promise.all([700, 900].map((weight) => document.fonts.load(`${weight} 13px ${font}`))))
      .then(() => setFonts(1));
  }, []);

  useEffect(() => () => void zoomer.current?.then(({ stop }) => stop()), []);

  /** Zooming is sent for when somebody comes near the picture: many only look. */
  const zoom = () => {
    zoomer.current ??= import('./zoom').then(({ zoomOn }) =>
      zoomOn(
        canvas.current as HTMLElement,
        () => (props.scene.current as Scene).plot,
        (next) => {
          setHovered(undefined);
          setView(next);
        },
      ),
    );
    return zoomer.current;
  };
  const zoomBy = (factor: number) => void zoom().then(({ by }) => by(factor));
  const seeWhole = () => void zoom().then(({ whole }) => whole());

  const grasp = (event: PointerEvent<HTMLElement>, id: string) => {
    if (event.button !== 0) return;
    event.currentTarget.setPointerCapture(event.pointerId);
    const from = placeIn(root.current, event);
    const [x, y] = scene.handles.find((handle) => handle.id === id)?.true ?? from;
    drag.current = { id, offset: [x - from[0], y - from[1]], at: from, frame: 0, moved: false };
    setHovered(undefined);
  };

  const pull = (event: PointerEvent<HTMLElement>) => {
    const held = drag.current;
    if (!held || !movable) return;
    const at = placeIn(root.current, event);
    if (!held.moved) {
      if (Math.hypot(at[0] - held.at[0], at[1] - held.at[1]) < 3) return;
      held.moved = true;
      props.onGrasp(held.id);
    }
    held.at = at;
    // However often the pointer reports, each frame computes and draws once, before it is shown.
    held.frame ||= requestAnimationFrame(() => {
      held.frame = 0;
      flushSync(() => follow.current(held));
    });
  };

  const follow = useRef<(held: { id: string; offset: Place; at: Place }) => void>(() => undefined);
  follow.current = ({ id, offset, at }) => {
    const size = sizeNear(scene, id, [at[0] + offset[0], at[1] + offset[1]]);
    if (size !== undefined) onMove(id, size);
  };

  const letGo = () => {
    const held = drag.current;
    drag.current = null;
    if (!held) return;
    if (!held.moved) return onChoose(held.id);
    cancelAnimationFrame(held.frame);
    follow.current(held);
    props.onRelease(held.id);
  };

  const onKeyDown = (event: KeyboardEvent, handle: ChartHandle) => {
    const { id } = handle;
    if (event.ctrlKey || event.metaKey || event.altKey) return;
    if (event.key === 'Enter' || event.key === ' ') {
      event.preventDefault();
      return onChoose(id);
    }
    const size = sizeByKey(event.key, handle);
    if (!movable || size === undefined) return;
    event.preventDefault();
    if (size === handle.now) return;
    props.onGrasp(id);
    onMove(id, size);
    props.onRelease(id);
  };

  const told = shown ?? hovered?.id;
  const handleOf = (id: string) => scene.handles.find((each) => each.id === id);
  const at = shown ? handleOf(shown)?.at : hovered?.at;
  const size = shown ? handles.find(({ id }) => id === shown)?.now : hovered?.size;
  return (
    // biome-ignore lint/a11y/useSemanticElements: a fieldset is for forms; this groups a picture's controls.
    <div
      ref={root}
      role="group"
      aria-label={label}
      className={styles.chart}
      onKeyDown={({ key }) => {
        if (key === '+') zoomBy(1.5);
        if (key === '-') zoomBy(1 / 1.5);
        if (key === '0') seeWhole();
      }}
      onPointerEnter={zoom}
      onFocus={zoom}
    >
      <canvas
        ref={canvas}
        className={mergeClasses(styles.canvas, view.k > 1 && styles.zoomed)}
        style={{ aspectRatio: `${width} / ${height}` }}
        onPointerMove={(event) => {
          const found = finder(placeIn(root.current, event));
          if (found?.id !== hovered?.id || found?.size !== hovered?.size) setHovered(found);
        }}
        onPointerLeave={() => setHovered(undefined)}
      />
      {handles.map((handle) => {
        const place = handleOf(handle.id)?.at;
        if (!place) return null;
        const { id, label: name, valueText, now, smallest, largest } = handle;
        const common = {
          'data-option': id,
          style: { left: place[0], top: place[1] },
          onPointerDown: (event: PointerEvent<HTMLElement>) => grasp(event, id),
          onPointerMove: pull,
          onPointerUp: letGo,
          onPointerCancel: letGo,
          onPointerEnter: () => setShown(id),
          onPointerLeave: () => setShown(undefined),
          onFocus: () => setShown(id),
          onBlur: () => setShown(undefined),
          onKeyDown: (event: KeyboardEvent) => onKeyDown(event, handle),
        };
        return movable ? (
          <div
            key={id}
            {...common}
            role="slider"
            tabIndex={0}
            aria-label={name}
            aria-valuemin={smallest}
            aria-valuemax={largest}
            aria-valuenow={now}
            aria-valuetext={valueText}
            className={mergeClasses(styles.handle, styles.movable)}
          />
        ) : (
          <div
            key={id}
            {...common}
            role="img"
            // biome-ignore lint/a11y/noNoninteractiveTabindex: the keyboard must reach what it tells.
            tabIndex={0}
            aria-label={`${name}: ${valueText}`}
            className={styles.handle}
          />
        );
      })}
      {!shown && hovered && (
        <div className={styles.dot} style={{ left: hovered.at[0], top: hovered.at[1] }} />
      )}
      {told && at && size !== undefined && (
        <div aria-hidden="true" className={styles.tip} style={besides(at, width, height)}>
          {describe(told, size).map((line) => (
            <div key={line}>{line}</div>
          ))}
        </div>
      )}
      <div className={styles.tools}>
        {view.k > 1 && (
          <Button size="small" className={styles.tool} onClick={seeWhole}>
            Whole picture
          </Button>
        )}
        <Button
          size="small"
          appearance="subtle"
          className={styles.tool}
          aria-label="Zoom out"
          disabledFocusable={view.k <= 1}
          onClick={() => zoomBy(1 / 1.5)}
        >
          −
        </Button>
        <Button
          size="small"
          appearance="subtle"
          className={styles.tool}
          aria-label="Zoom in"
          onClick={() => zoomBy(1.5)}
        >
          +
        </Button>
      </div>
    </div>
  );
}

import { makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import {
  cloneElement,
  type FocusEvent,
  type PointerEvent,
  type ReactElement,
  type ReactNode,
  useContext,
  useEffect,
  useId,
  useRef,
  useState,
} from 'react';
import { createPortal } from 'react-dom';
import { MountContext } from './mount';

const widest = 240;

const useStyles = makeStyles({
  tip: {
    position: 'fixed',
    zIndex: 10,
    width: 'max-content',
    maxWidth: `${widest}px`,
    padding: '5px 10px 6px',
    border: `1px solid ${tokens.colorNeutralStroke1}`,
    borderRadius: '6px',
    backgroundColor: tokens.colorNeutralBackground1,
    color: tokens.colorNeutralForeground1,
    boxShadow: tokens.shadow8,
    fontSize: '13px',
    lineHeight: '18px',
    fontWeight: 400,
    textAlign: 'start',
    overflowWrap: 'anywhere',
    '@media print': { display: 'none' },
  },
  centred: { transform: 'translateX(-50%)' },
});

/** Milliseconds a pointer rests before it shows, and may take on its way into it. */
const [rest, way] = [250, 150];

interface Place {
  left: number;
  top?: number;
  bottom?: number;
}

interface TipProps {
  says: ReactNode;
  /** Whether it names what it belongs to, adds to it, or only shows what is told there anyway. */
  relationship?: 'label' | 'description' | 'inaccessible';
  /** Whether it begins where what it belongs to begins, below it, and is as wide as its content. */
  below?: boolean;
  /** Whether pressing shows it too. */
  pressed?: boolean;
  children: ReactElement<Record<string, unknown>>;
}

/** A few words that show beside something while it is pointed at or focused; Escape puts them away. */
export function Tip({ says, relationship = 'description', below, pressed, children }: TipProps) {
  const styles = useStyles();
  const mount = useContext(MountContext);
  const id = useId();
  const [place, setPlace] = useState<Place>();
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  const told = relationship !== 'inaccessible';

  const after = (milliseconds: number, next: Place | undefined) => {
    clearTimeout(timer.current);
    timer.current = setTimeout(() => setPlace(next), milliseconds);
  };
  const show = ({ currentTarget }: FocusEvent | PointerEvent) =>
    after(0, placeBeside(currentTarget.getBoundingClientRect(), below ?? false));
  const hide = () => after(way, undefined);

  useEffect(() => () => clearTimeout(timer.current), []);
  useEffect(() => {
    if (!place) return;
    const close = () => setPlace(undefined);
    const closeOnEscape = ({ key }: KeyboardEvent) => key === 'Escape' && close();
    document.addEventListener('keydown', closeOnEscape);
    document.addEventListener('scroll', close, true);
    return () => {
      document.removeEventListener('keydown', closeOnEscape);
      document.removeEventListener('scroll', close, true);
    };
  }, [place]);

  return (
    <>
      {cloneElement(children, {
        ...(told && { [relationship === 'label' ? 'aria-labelledby' : 'aria-describedby']: id }),
        onPointerEnter: ({ currentTarget }: PointerEvent) =>
          after(rest, placeBeside(currentTarget.getBoundingClientRect(), below ?? false)),
        onPointerLeave: hide,
        onFocus: show,
        onBlur: hide,
        ...(pressed && { onClick: show }),
      })}
      {mount &&
        (place || told) &&
        createPortal(
          <div
            id={id}
            role="tooltip"
            hidden={!place}
            className={mergeClasses(styles.tip, !below && styles.centred)}
            style={below ? { ...place, maxWidth: 'calc(100vw - 16px)' } : place}
            onPointerEnter={() => clearTimeout(timer.current)}
            onPointerLeave={hide}
          >
            {says}
          </div>,
          mount,
        )}
    </>
  );
}

/** Above what it belongs to where there is room, else below, and within the window. */
function placeBeside({ left, width, top, bottom }: DOMRect, below: boolean): Place {
  const gap = 6;
  if (below) return { left: Math.max(8, Math.min(left, innerWidth - 328)), top: bottom + gap };
  const half = widest / 2 + 8;
  const centre = Math.max(half, Math.min(left + width / 2, innerWidth - half));
  return top > 140 ? { left: centre, bottom: innerHeight - top + gap } : { left: centre, top: bottom + gap };
}

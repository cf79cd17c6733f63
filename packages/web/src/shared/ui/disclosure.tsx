import { Button, makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import { type ReactNode, useEffect, useId, useRef, useState } from 'react';
import { onBar } from './own-tokens';

// Where the bar is as narrow as a phone, a panel hangs from the bar's edge rather than from its button.
const narrow = '@media (max-width: 640px)';

const useStyles = makeStyles({
  root: { position: 'relative', minWidth: 0, [narrow]: { position: 'static' } },
  trigger: {
    minWidth: 0,
    maxWidth: '100%',
    padding: '3px 6px',
    color: onBar.text,
    fontWeight: 400,
    ':hover': { color: onBar.text, backgroundColor: onBar.raised },
    ':hover:active': { color: onBar.text, backgroundColor: onBar.raised },
    ':focus-visible': { outline: `2px solid ${onBar.text}`, outlineOffset: '-2px' },
  },
  panel: {
    position: 'absolute',
    top: 'calc(100% + 6px)',
    zIndex: 1,
    width: 'max-content',
    minWidth: '200px',
    maxWidth: 'min(320px, calc(100vw - 24px))',
    maxHeight: 'calc(100vh - 64px)',
    overflowY: 'auto',
    padding: '6px',
    border: `1px solid ${tokens.colorNeutralStroke2}`,
    borderRadius: '8px',
    backgroundColor: tokens.colorNeutralBackground1,
    color: tokens.colorNeutralForeground1,
    boxShadow: tokens.shadow16,
    overflowWrap: 'anywhere',
  },
  start: { left: 0, [narrow]: { left: '12px' } },
  end: { right: 0, [narrow]: { right: '12px' } },
});

interface DisclosureProps {
  label: string;
  trigger: ReactNode;
  align: 'start' | 'end';
  className?: string;
  /** What it discloses; `close` puts it away again. */
  children: (close: () => void) => ReactNode;
}

/** A button on the bar that opens a panel below itself; Escape, a press elsewhere or leaving it closes it. */
export function Disclosure({ label, trigger, align, className, children }: DisclosureProps) {
  const styles = useStyles();
  const id = useId();
  const root = useRef<HTMLDivElement>(null);
  const button = useRef<HTMLButtonElement>(null);
  const [open, setOpen] = useState(false);
  const close = () => setOpen(false);

  useEffect(() => {
    if (!open) return;
    const closeFromOutside = ({ target }: Event) => {
      if (!root.current?.contains(target as Node)) setOpen(false);
    };
    const closeOnEscape = ({ key }: KeyboardEvent) => {
      if (key !== 'Escape') return;
      setOpen(false);
      button.current?.focus();
    };
    document.addEventListener('pointerdown', closeFromOutside);
    document.addEventListener('focusin', closeFromOutside);
    document.addEventListener('keydown', closeOnEscape);
    return () => {
      document.removeEventListener('pointerdown', closeFromOutside);
      document.removeEventListener('focusin', closeFromOutside);
      document.removeEventListener('keydown', closeOnEscape);
    };
  }, [open]);

  return (
    <div ref={root} className={mergeClasses(styles.root, className)}>
      <Button
        ref={button}
        appearance="transparent"
        className={styles.trigger}
        aria-label={label}
        aria-expanded={open}
        aria-controls={open ? id : undefined}
        onClick={() => setOpen(!open)}
      >
        {trigger}
      </Button>
      {open && (
        <div id={id} className={mergeClasses(styles.panel, align === 'end' ? styles.end : styles.start)}>
          {children(close)}
        </div>
      )}
    </div>
  );
}

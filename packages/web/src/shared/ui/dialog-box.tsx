import { makeStyles, tokens } from '@fluentui/react-components';
import { type ReactNode, useEffect, useId, useState } from 'react';
import { MountContext } from './mount';

const useStyles = makeStyles({
  box: {
    width: 'min(560px, calc(100vw - 24px))',
    maxHeight: 'calc(100dvh - 24px)',
    padding: '18px 20px',
    border: `1px solid ${tokens.colorNeutralStroke2}`,
    borderRadius: '10px',
    backgroundColor: tokens.colorNeutralBackground1,
    color: tokens.colorNeutralForeground1,
    boxShadow: tokens.shadow28,
    overflowY: 'auto',
    overflowWrap: 'anywhere',
    '::backdrop': { backgroundColor: tokens.colorBackgroundOverlay },
  },
  title: { marginBottom: '12px', fontSize: '17px', lineHeight: '24px', fontWeight: 700 },
});

interface DialogBoxProps {
  title: string;
  onClose: () => void;
  /** What it holds; `close` puts it away and gives the focus back to where it came from. */
  children: (close: () => void) => ReactNode;
}

/** A question or short form over the page. */
export function DialogBox({ title, onClose, children }: DialogBoxProps) {
  const styles = useStyles();
  const titleId = useId();
  const [dialog, setDialog] = useState<HTMLDialogElement | null>(null);
  useEffect(() => dialog?.showModal(), [dialog]);
  return (
    <dialog ref={setDialog} aria-labelledby={titleId} className={styles.box} onClose={onClose}>
      {dialog && (
        <MountContext value={dialog}>
          <h2 id={titleId} className={styles.title}>
            {title}
          </h2>
          {children(() => dialog.close())}
        </MountContext>
      )}
    </dialog>
  );
}

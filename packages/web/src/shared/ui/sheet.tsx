import { Button, makeStyles, tokens } from '@fluentui/react-components';
import { DismissRegular } from '@fluentui/react-icons';
import { type ReactNode, useEffect, useId, useState } from 'react';
import { MountContext } from './mount';

const useStyles = makeStyles({
  sheet: {
    width: '100vw',
    maxWidth: '100vw',
    height: '100dvh',
    maxHeight: '100dvh',
    margin: 0,
    padding: 0,
    border: 'none',
    backgroundColor: tokens.colorNeutralBackground1,
    color: tokens.colorNeutralForeground1,
  },
  head: {
    position: 'sticky',
    top: 0,
    zIndex: 1,
    display: 'flex',
    alignItems: 'flex-start',
    gap: '10px',
    padding: '12px',
    backgroundColor: tokens.colorNeutralBackground1,
  },
  title: {
    display: 'flex',
    gap: '10px',
    flexGrow: 1,
    minWidth: 0,
    fontSize: '16px',
    lineHeight: '24px',
    fontWeight: 700,
    overflowWrap: 'anywhere',
  },
  close: { flexShrink: 0, minWidth: 0 },
  body: { padding: '0 12px 24px' },
});

/** Something over the whole of a small screen; closing it gives the focus back to where it came from. */
export function Sheet(props: { title: ReactNode; onClose: () => void; children: ReactNode }) {
  const styles = useStyles();
  const title = useId();
  const [dialog, setDialog] = useState<HTMLDialogElement | null>(null);

  useEffect(() => dialog?.showModal(), [dialog]);

  return (
    <dialog ref={setDialog} aria-labelledby={title} className={styles.sheet} onClose={props.onClose}>
      {dialog && (
        // What pops up from within must stand in the dialog too: the page below it is out of reach.
        <MountContext value={dialog}>
          <div className={styles.head}>
            <h2 id={title} className={styles.title}>
              {props.title}
            </h2>
            <Button
              appearance="subtle"
              icon={<DismissRegular />}
              className={styles.close}
              aria-label="Close"
              onClick={() => dialog.close()}
            />
          </div>
          <div className={styles.body}>{props.children}</div>
        </MountContext>
      )}
    </dialog>
  );
}

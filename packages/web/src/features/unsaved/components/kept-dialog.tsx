import { Button, makeStyles } from '@fluentui/react-components';
import type { ReactNode } from 'react';
import { DialogBox } from '../../../shared/ui/dialog-box';
import { Form } from '../../../shared/ui/form';

const useStyles = makeStyles({
  actions: { display: 'flex', flexWrap: 'wrap', justifyContent: 'flex-end', gap: '8px' },
});

interface KeptDialogProps {
  title: string;
  label: string;
  /** What the button that stores it says. */
  verb: string;
  kept: {
    fault: string | undefined;
    busy: boolean;
    submit: () => Promise<boolean>;
    discard: () => void;
  };
  /** Both versions, where somebody else saved first. */
  conflict: ReactNode;
  onClose: () => void;
  children: ReactNode;
}

/** A short form over the page: Escape leaves what was typed for the next time, Cancel drops it. */
export function KeptDialog({ title, label, verb, kept, conflict, onClose, children }: KeptDialogProps) {
  const styles = useStyles();
  return (
    <DialogBox title={title} onClose={onClose}>
      {(close) => (
        <Form
          label={label}
          fault={kept.fault}
          onSubmit={() => void kept.submit().then((done) => done && close())}
        >
          {conflict}
          {children}
          <div className={styles.actions}>
            <Button
              onClick={() => {
                kept.discard();
                close();
              }}
            >
              Cancel
            </Button>
            <Button type="submit" appearance="primary" disabledFocusable={kept.busy}>
              {verb}
            </Button>
          </div>
        </Form>
      )}
    </DialogBox>
  );
}

import { Button, Field, Input, makeStyles } from '@fluentui/react-components';
import type { InvitationView } from '@steelyard/api/contract/people';
import { useRef, useState } from 'react';
import { fullDate } from '../../../shared/format/times';
import { DialogBox } from '../../../shared/ui/dialog-box';

const useStyles = makeStyles({
  body: { display: 'grid', gap: '14px' },
  actions: { display: 'flex', flexWrap: 'wrap', gap: '8px' },
});

interface OneTimeLinkProps {
  invitation: InvitationView;
  onClose: () => void;
}

/** The link, shown this once: the server keeps only its hash. */
export function OneTimeLink({ invitation: { person, link }, onClose }: OneTimeLinkProps) {
  const styles = useStyles();
  const field = useRef<HTMLInputElement>(null);
  const [said, setSaid] = useState('');
  const address = new URL(link, location.origin).href;

  // A browser may refuse its clipboard; then the link is marked, ready to be copied by hand.
  const copy = () =>
    navigator.clipboard.writeText(address).then(
      () => setSaid('Copied.'),
      () => {
        field.current?.select();
        setSaid('This browser does not let us copy; the link is marked, copy it by hand.');
      },
    );

  return (
    <DialogBox title={`Link for ${person.name}`} onClose={onClose}>
      {(close) => (
        <div className={styles.body}>
          <p>
            Pass this link on to {person.name} yourself. It works once
            {person.linkExpiresAt && `, until ${fullDate(person.linkExpiresAt)}`}, and is shown only now.
          </p>
          <Field label="One-time link">
            <Input ref={field} readOnly value={address} />
          </Field>
          <p role="status">{said}</p>
          <div className={styles.actions}>
            <Button appearance="primary" onClick={() => void copy()}>
              Copy the link
            </Button>
            <Button onClick={close}>Done</Button>
          </div>
        </div>
      )}
    </DialogBox>
  );
}

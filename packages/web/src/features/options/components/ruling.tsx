import { Button, makeStyles, tokens } from '@fluentui/react-components';
import type { OptionView } from '@steelyard/api/contract/design-sets';
import { Suspense, useState } from 'react';
import { lazily } from '../../../shared/ui/lazily';
import { Moment } from '../../../shared/ui/moment';
import { Word } from '../../../shared/ui/words';
import { rulingWords } from '../model/ruling-words';

const RulingDialog = lazily(async () => (await import('./ruling-dialog')).RulingDialog);

const useStyles = makeStyles({
  ruling: {
    display: 'grid',
    justifyItems: 'start',
    gap: '4px',
    marginBottom: '12px',
    overflowWrap: 'anywhere',
  },
  line: { display: 'flex', flexWrap: 'wrap', alignItems: 'center', gap: '6px 8px' },
  note: { color: tokens.colorNeutralForeground2, fontSize: '13px', lineHeight: '18px' },
});

interface RulingProps {
  studyId: string;
  option: OptionView;
  /** The methodologist rules; others read it. */
  mayRule: boolean;
}

/** Whether the option may be chosen, and why. */
export function Ruling({ studyId, option, mayRule }: RulingProps) {
  const styles = useStyles();
  const [editing, setEditing] = useState(false);
  const { ruling } = option;
  return (
    <div className={styles.ruling}>
      <div className={styles.line}>
        <Word is="ruling" chip>
          {ruling ? rulingWords[ruling.kind] : 'No ruling yet'}
        </Word>
        {mayRule && (
          <Button size="small" onClick={() => setEditing(true)}>
            {ruling ? 'Change the ruling' : 'Rule on it'}
          </Button>
        )}
      </div>
      {ruling && (
        <p className={styles.note}>
          {ruling.reason} {ruling.by}, <Moment iso={ruling.at} />
        </p>
      )}
      {editing && (
        <Suspense>
          <RulingDialog studyId={studyId} option={option} onClose={() => setEditing(false)} />
        </Suspense>
      )}
    </div>
  );
}

import { Button, makeStyles, tokens } from '@fluentui/react-components';
import { ArrowUndoRegular } from '@fluentui/react-icons';
import { OptionTag } from '../../../shared/ui/option-tag';
import { ownTokens } from '../../../shared/ui/own-tokens';
import type { Weighed } from '../model/weighing';

const useStyles = makeStyles({
  bar: {
    display: 'flex',
    flexWrap: 'wrap',
    alignItems: 'center',
    gap: '4px 10px',
    padding: '6px 14px',
    borderBottom: `1px solid ${tokens.colorNeutralStroke2}`,
    backgroundColor: ownTokens.brassSoft,
    fontSize: '13px',
    lineHeight: '18px',
    overflowWrap: 'anywhere',
  },
  words: { flex: '1 1 180px', minWidth: 0 },
  back: { flexShrink: 0, '@media print': { display: 'none' } },
});

/** Says which option the others are told against, and leads back; silent where there is none. */
export function AgainstBar({ reference, onBack }: { reference: Weighed | undefined; onBack: () => void }) {
  const styles = useStyles();
  return (
    <div role="status">
      {reference && (
        <div className={styles.bar}>
          <OptionTag
            small
            letter={reference.letter}
            position={reference.position}
            outlined={reference.ruling?.kind === 'not-admissible'}
          />
          <span className={styles.words}>
            Each option told against {reference.letter}, {reference.name}
          </span>
          <Button size="small" icon={<ArrowUndoRegular />} className={styles.back} onClick={onBack}>
            Back to the limits
          </Button>
        </div>
      )}
    </div>
  );
}

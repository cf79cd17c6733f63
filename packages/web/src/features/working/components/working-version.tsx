import { makeStyles, tokens } from '@fluentui/react-components';
import { ownTokens } from '../../../shared/ui/own-tokens';
import { TextLink } from '../../../shared/ui/text-link';

const useStyles = makeStyles({
  notice: {
    marginTop: '10px',
    padding: '8px 12px',
    borderLeft: `3px solid ${tokens.colorBrandForeground1}`,
    borderRadius: '6px',
    backgroundColor: ownTokens.brassSoft,
  },
});

interface WorkingVersionProps {
  /** The figures are those of the person's edits. */
  edited: boolean;
  storedHref: string;
  /** Where what is stored was asked for: the way to the edits, if there are any. */
  editedHref: string | undefined;
}

/** Says whose version of the option is worked out, and leads to the other one. */
export function WorkingVersion({ edited, storedHref, editedHref }: WorkingVersionProps) {
  const styles = useStyles();
  if (edited) {
    return (
      <p className={styles.notice}>
        This is the working of your edits, which are not saved: others see the stored option.{' '}
        <TextLink to={storedHref}>The working of what is stored</TextLink>
      </p>
    );
  }
  if (!editedHref) return null;
  return (
    <p className={styles.notice}>
      This is the working of the option as it is stored, as others see it.{' '}
      <TextLink to={editedHref}>The working with your edits</TextLink>
    </p>
  );
}

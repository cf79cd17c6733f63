import { Button, makeStyles } from '@fluentui/react-components';
import { ApiError } from '../api/client';
import { messageOf } from '../api/faults';
import { Notice } from './notice';

const useStyles = makeStyles({
  bar: { margin: '16px' },
  heading: { display: 'inline', fontSize: 'inherit', lineHeight: 'inherit', fontWeight: 700 },
});

interface FaultProps {
  error: unknown;
  what: string;
  /** It stands in place of the whole page, so it brings the page's heading and title. */
  wholePage?: boolean;
  onRetry: () => void;
}

/** What went wrong in place of what was asked for, with a way to try again where that may help. */
export function Fault({ error, what, wholePage, onRetry }: FaultProps) {
  const styles = useStyles();
  const absent = error instanceof ApiError && error.status === 404;
  const reference = error instanceof ApiError ? error.problem.correlationId : undefined;
  const heading = absent ? `There is no ${what} here` : `The ${what} could not be shown`;
  const Heading = wholePage ? 'h1' : 'strong';
  return (
    <Notice
      intent="error"
      className={styles.bar}
      actions={!absent && <Button onClick={onRetry}>Try again</Button>}
    >
      {wholePage && <title>{`${heading} · Steelyard`}</title>}
      <Heading className={styles.heading}>{heading}.</Heading> {explanation(error, absent)}
      {reference && ` Reference for support: ${reference}.`}
    </Notice>
  );
}

function explanation(error: unknown, absent: boolean): string {
  if (absent) return 'It may have been removed, or it is not open to you.';
  return sentence(messageOf(error));
}

const sentence = (text: string) => (text.endsWith('.') ? text : `${text}.`);

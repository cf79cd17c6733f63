import { Button, makeStyles, tokens } from '@fluentui/react-components';
import { useRef, useState } from 'react';
import { ScrollRegion } from '../../../shared/ui/scroll-region';

const useStyles = makeStyles({
  disclosure: {
    padding: '10px 0',
    borderTop: `1px solid ${tokens.colorNeutralStroke2}`,
    '@media print': { display: 'none' },
  },
  summary: {
    width: 'fit-content',
    cursor: 'pointer',
    color: tokens.colorBrandForeground1,
    fontSize: '13px',
    lineHeight: '18px',
    fontWeight: 700,
    borderRadius: '4px',
    ':focus-visible': { outline: `2px solid ${tokens.colorStrokeFocus2}`, outlineOffset: '2px' },
  },
  told: { display: 'flex', flexWrap: 'wrap', alignItems: 'center', gap: '6px 12px', marginBlock: '8px' },
  box: {
    padding: '12px 14px',
    border: `1px solid ${tokens.colorNeutralStroke2}`,
    borderRadius: '8px',
    backgroundColor: tokens.colorNeutralBackground1,
  },
  text: {
    margin: 0,
    fontFamily: tokens.fontFamilyMonospace,
    fontSize: '13px',
    lineHeight: '18px',
  },
});

/** The request behind the figures, to be computed again on the command line. */
export function RequestJson({ request }: { request: object }) {
  const styles = useStyles();
  const text = useRef<HTMLPreElement>(null);
  const [outcome, setOutcome] = useState('');
  const json = JSON.stringify(request, null, 2);

  const copy = async () => {
    try {
      await navigator.clipboard.writeText(json);
      setOutcome('Copied.');
    } catch {
      if (text.current) getSelection()?.selectAllChildren(text.current);
      setOutcome('The browser keeps its clipboard closed here; the text is selected for you to copy.');
    }
  };

  return (
    <details className={styles.disclosure}>
      <summary className={styles.summary}>Request as JSON</summary>
      <div className={styles.told}>
        <Button size="small" onClick={() => void copy()}>
          Copy
        </Button>
        <span role="status">{outcome}</span>
      </div>
      <ScrollRegion label="Request as JSON" className={styles.box}>
        <pre ref={text} className={styles.text}>
          {json}
        </pre>
      </ScrollRegion>
    </details>
  );
}

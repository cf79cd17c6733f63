import { makeStyles, tokens } from '@fluentui/react-components';
import { type ReactNode, useId } from 'react';

const useStyles = makeStyles({
  section: { breakInside: 'avoid' },
  heading: {
    marginBottom: '6px',
    paddingTop: '10px',
    borderTop: `1px solid ${tokens.colorNeutralStroke2}`,
    color: tokens.colorBrandForeground1,
    fontSize: '13px',
    lineHeight: '18px',
    fontWeight: 700,
  },
});

/** A part of a panel or page under a small brass heading. */
export function TitledSection(props: { title: ReactNode; level: 2 | 3; children: ReactNode }) {
  const styles = useStyles();
  const id = useId();
  const Heading = `h${props.level}` as const;
  return (
    <section aria-labelledby={id} className={styles.section}>
      <Heading id={id} className={styles.heading}>
        {props.title}
      </Heading>
      {props.children}
    </section>
  );
}

import { makeStyles, tokens } from '@fluentui/react-components';
import type { ReactNode } from 'react';

const useStyles = makeStyles({
  chip: {
    display: 'inline-flex',
    alignItems: 'center',
    padding: '1px 10px',
    borderRadius: '999px',
    border: `1px solid ${tokens.colorNeutralStroke1}`,
    backgroundColor: tokens.colorNeutralBackground1,
    color: tokens.colorNeutralForeground1,
    fontSize: '13px',
    lineHeight: '20px',
    whiteSpace: 'nowrap',
  },
});

export function Chip({ children }: { children: ReactNode }) {
  return <span className={useStyles().chip}>{children}</span>;
}

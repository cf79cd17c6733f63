import { makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import { ErrorCircleRegular, InfoRegular, WarningRegular } from '@fluentui/react-icons';
import type { ReactNode } from 'react';

const useStyles = makeStyles({
  notice: {
    display: 'grid',
    gridTemplateColumns: 'auto minmax(0, 1fr)',
    gap: '8px 10px',
    padding: '8px 12px',
    border: `1px solid ${tokens.colorNeutralStroke1}`,
    borderRadius: '6px',
    backgroundColor: tokens.colorNeutralBackground1,
    color: tokens.colorNeutralForeground1,
    overflowWrap: 'anywhere',
  },
  error: { border: `1px solid ${tokens.colorStatusDangerBorder1}` },
  icon: { display: 'flex', alignItems: 'center', height: '20px', fontSize: '20px' },
  errorIcon: { color: tokens.colorStatusDangerForeground1 },
  warningIcon: { color: tokens.colorBrandForeground1 },
  actions: { gridColumn: '2', display: 'flex', flexWrap: 'wrap', justifyContent: 'flex-end', gap: '8px' },
});

interface NoticeProps {
  intent: 'error' | 'warning' | 'info';
  role?: 'alert';
  className?: string | undefined;
  actions?: ReactNode;
  children: ReactNode;
}

/** A message in the page, its kind told by an icon. */
export function Notice({ intent, role, className, actions, children }: NoticeProps) {
  const styles = useStyles();
  const Icon = { error: ErrorCircleRegular, warning: WarningRegular, info: InfoRegular }[intent];
  return (
    <div role={role} className={mergeClasses(styles.notice, intent === 'error' && styles.error, className)}>
      <span
        className={mergeClasses(
          styles.icon,
          intent === 'error' && styles.errorIcon,
          intent === 'warning' && styles.warningIcon,
        )}
      >
        <Icon aria-hidden="true" />
      </span>
      <div>{children}</div>
      {actions && <div className={styles.actions}>{actions}</div>}
    </div>
  );
}

import { makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import { Link, type LinkProps } from 'react-router-dom';

const useStyles = makeStyles({
  link: {
    color: tokens.colorBrandForegroundLink,
    textDecorationLine: 'underline',
    textDecorationThickness: '1px',
    textUnderlineOffset: '3px',
    borderRadius: tokens.borderRadiusSmall,
    ':hover': { textDecorationThickness: '2px' },
    ':focus-visible': { outline: `2px solid ${tokens.colorStrokeFocus2}`, outlineOffset: '2px' },
  },
  button: {
    display: 'inline-flex',
    alignItems: 'center',
    gap: '6px',
    padding: '5px 12px',
    border: `1px solid ${tokens.colorNeutralStroke1}`,
    borderRadius: tokens.borderRadiusMedium,
    backgroundColor: tokens.colorNeutralBackground1,
    color: tokens.colorNeutralForeground1,
    lineHeight: '20px',
    textDecorationLine: 'none',
    ':hover': {
      backgroundColor: tokens.colorNeutralBackground1Hover,
      border: `1px solid ${tokens.colorNeutralForeground1}`,
    },
    ':focus-visible': { outline: `2px solid ${tokens.colorStrokeFocus2}`, outlineOffset: '2px' },
    '@media print': { display: 'none' },
  },
});

const usePrimaryStyles = makeStyles({
  primary: {
    border: `1px solid ${tokens.colorBrandBackground}`,
    backgroundColor: tokens.colorBrandBackground,
    color: tokens.colorNeutralForegroundOnBrand,
    fontWeight: 700,
    ':hover': {
      border: `1px solid ${tokens.colorBrandBackgroundHover}`,
      backgroundColor: tokens.colorBrandBackgroundHover,
    },
  },
});

export function TextLink({ className, ...props }: LinkProps) {
  return <Link {...props} className={mergeClasses(useStyles().link, className)} />;
}

/** A link to somewhere else that looks like a button. */
export function ButtonLink({ className, ...props }: LinkProps) {
  return <Link {...props} className={mergeClasses(useStyles().button, className)} />;
}

/** The one thing a screen is there for, where that is to go elsewhere. */
export function PrimaryLink({ className, ...props }: LinkProps) {
  return <ButtonLink {...props} className={mergeClasses(usePrimaryStyles().primary, className)} />;
}

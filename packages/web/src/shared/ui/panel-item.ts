import { makeStyles, tokens } from '@fluentui/react-components';
import { ownTokens } from './own-tokens';

/** How the lines of a disclosed panel look, links and buttons alike. */
export const usePanelStyles = makeStyles({
  item: {
    appearance: 'none',
    display: 'flex',
    alignItems: 'center',
    gap: '9px',
    width: '100%',
    padding: '7px 10px',
    border: 'none',
    borderRadius: '6px',
    background: 'none',
    font: 'inherit',
    lineHeight: '20px',
    color: tokens.colorNeutralForeground1,
    textAlign: 'start',
    textDecorationLine: 'none',
    cursor: 'pointer',
    ':hover': { backgroundColor: tokens.colorNeutralBackground1Hover },
    ':focus-visible': { outline: `2px solid ${tokens.colorStrokeFocus2}`, outlineOffset: '-2px' },
    ':has(:focus-visible)': { outline: `2px solid ${tokens.colorStrokeFocus2}`, outlineOffset: '-2px' },
  },
  here: { backgroundColor: ownTokens.brassSoft, fontWeight: 700 },
  group: {
    margin: 0,
    padding: '6px 0 0',
    border: 'none',
    borderTop: `1px solid ${tokens.colorNeutralStroke2}`,
    marginTop: '6px',
    minWidth: 0,
  },
  heading: {
    padding: '2px 10px',
    color: tokens.colorNeutralForeground2,
    fontSize: '13px',
    lineHeight: '18px',
  },
});

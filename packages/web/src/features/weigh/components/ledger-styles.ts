import { makeStyles, tokens } from '@fluentui/react-components';
import { ownTokens } from '../../../shared/ui/own-tokens';

/** A planning value on its line, to be read or overridden. */
export const useLedgerStyles = makeStyles({
  label: { overflowWrap: 'anywhere' },
  value: {
    minWidth: '72px',
    padding: '2px 9px',
    textAlign: 'end',
    borderRadius: '5px',
    border: `1px solid ${tokens.colorNeutralStroke2}`,
    backgroundColor: ownTokens.brassSoft,
  },
  note: {
    gridColumn: '1 / -1',
    color: tokens.colorNeutralForeground2,
    fontSize: '13px',
    lineHeight: '17px',
    overflowWrap: 'anywhere',
  },
});

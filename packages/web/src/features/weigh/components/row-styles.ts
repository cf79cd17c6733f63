import { makeStyles } from '@fluentui/react-components';

export const narrow = '@media (max-width: 640px)';

/** What the cells of all beam rows have in common; on a small screen a row is a card. */
export const useCellStyles = makeStyles({
  cell: {
    height: '54px',
    padding: '7px 6px',
    minWidth: 0,
    ':first-child': { paddingLeft: '14px' },
    ':last-child': { paddingRight: '14px' },
    '@media print': { height: '44px', paddingBlock: '4px' },
    [narrow]: {
      height: 'auto',
      padding: 0,
      ':first-child': { paddingLeft: 0 },
      ':last-child': { paddingRight: 0 },
    },
  },
});

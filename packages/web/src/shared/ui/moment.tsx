import { makeStyles } from '@fluentui/react-components';
import { ago, fullDate } from '../format/times';
import { Hint } from './hint';

const useStyles = makeStyles({ above: { position: 'relative', zIndex: 1 } });

/** How long ago something was; the full date shows when it is pointed at or focused. */
export function Moment({ iso }: { iso: string }) {
  return (
    <Hint says={fullDate(iso)} className={useStyles().above}>
      <time dateTime={iso}>{ago(iso, Date.now())}</time>
    </Hint>
  );
}

import { useRouteError } from 'react-router-dom';
import { Fault } from '../../shared/ui/fault';

/** The last resort: a page whose script or session could not be had, or that failed while it was drawn. */
export function ErrorPage() {
  return (
    <main>
      <Fault error={useRouteError()} what="page" wholePage onRetry={() => location.reload()} />
    </main>
  );
}

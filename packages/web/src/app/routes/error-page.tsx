import { Fault } from '../../shared/ui/fault';

/** The last resort: a page whose script or session could not be had, or that failed while it was drawn. */
export function ErrorPage({ error }: { error: unknown }) {
  return (
    <main>
      <Fault error={error} what="page" wholePage onRetry={() => location.reload()} />
    </main>
  );
}

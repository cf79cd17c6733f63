import { QueryErrorResetBoundary } from '@tanstack/react-query';
import { Component, type ReactNode, Suspense } from 'react';
import { ApiError } from '../api/client';
import { Fault } from './fault';

interface CatchProps {
  what: string;
  wholePage: boolean;
  onReset: () => void;
  children: ReactNode;
}

class Catch extends Component<CatchProps, { error: unknown }> {
  override state: { error: unknown } = { error: undefined };

  static getDerivedStateFromError(error: unknown) {
    return { error };
  }

  override render() {
    const { error } = this.state;
    if (error === undefined) return this.props.children;
    // The query client is already on its way to the sign-in page.
    if (error instanceof ApiError && error.status === 401) return null;
    const retry = () => {
      this.props.onReset();
      this.setState({ error: undefined });
    };
    const { what, wholePage } = this.props;
    return <Fault error={error} what={what} wholePage={wholePage} onRetry={retry} />;
  }
}

/** Around a part of a page that waits for the server: its skeleton meanwhile, the reason when it fails. */
export function QueryBoundary(props: {
  what: string;
  wholePage?: boolean;
  skeleton: ReactNode;
  children: ReactNode;
}) {
  return (
    <QueryErrorResetBoundary>
      {({ reset }) => (
        <Catch what={props.what} wholePage={props.wholePage ?? false} onReset={reset}>
          <Suspense fallback={props.skeleton}>{props.children}</Suspense>
        </Catch>
      )}
    </QueryErrorResetBoundary>
  );
}

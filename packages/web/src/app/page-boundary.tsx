import { Component, type ReactNode } from 'react';
import { ErrorPage } from './routes/error-page';

interface PageBoundaryProps {
  /** Where the failure was: at another address another page is tried. */
  address: string;
  children: ReactNode;
}

interface Caught {
  error: unknown;
}

export class PageBoundary extends Component<PageBoundaryProps, Caught> {
  override state: Caught = { error: undefined };

  static getDerivedStateFromError(error: unknown): Caught {
    return { error };
  }

  override componentDidUpdate({ address }: PageBoundaryProps, { error }: Caught) {
    if (error !== undefined && address !== this.props.address) this.setState({ error: undefined });
  }

  override render() {
    const { error } = this.state;
    return error === undefined ? this.props.children : <ErrorPage error={error} />;
  }
}

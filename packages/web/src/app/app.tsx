import { type QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { BrowserRouter } from 'react-router-dom';
import { Pages } from './pages';
import { SteelyardTheme } from './theme/steelyard-theme';

export function App({ queryClient }: { queryClient: QueryClient }) {
  return (
    <QueryClientProvider client={queryClient}>
      <SteelyardTheme>
        <BrowserRouter>
          <Pages />
        </BrowserRouter>
      </SteelyardTheme>
    </QueryClientProvider>
  );
}

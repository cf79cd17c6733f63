import './app/strict-csp';
import '@fontsource/lato/400.css';
import '@fontsource/lato/700.css';
import '@fontsource/lato/900.css';
import './app/global.css';
import { createRoot } from 'react-dom/client';
import { App } from './app/app';
import { createQueryClient } from './app/query-client';

createRoot(document.getElementById('root') as HTMLElement).render(<App queryClient={createQueryClient()} />);

import './app/strict-csp';
import '@fontsource/lato/400.css';
import '@fontsource/lato/700.css';
import '@fontsource/lato/900.css';
import './app/global.css';
import { createRoot } from 'react-dom/client';
import { createBrowserRouter } from 'react-router-dom';
import { App, createSteelyard } from './app/app';

const steelyard = createSteelyard((routes) => createBrowserRouter(routes));
createRoot(document.getElementById('root') as HTMLElement).render(<App {...steelyard} />);

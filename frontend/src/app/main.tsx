import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import '../theme/fonts.css';
import { App } from './App';

const root = document.getElementById('root');
if (root === null) throw new Error('The page has no #root element.');
createRoot(root).render(
  <StrictMode>
    <App />
  </StrictMode>,
);

import './config/validation.ts';
import './theme/theme.css';

// Only after validation has been set up may schemas be made.
const { start } = await import('./app/start.tsx');
start();

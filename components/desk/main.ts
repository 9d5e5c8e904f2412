import './page/desk-page.js';
import { startDesk } from './page/start-desk.js';

const page = document.querySelector('desk-page');
if (page) await startDesk(page);

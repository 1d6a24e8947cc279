// npm run build: installs and builds what is not done yet.
import { prepare } from './prepare.mjs';

await prepare();

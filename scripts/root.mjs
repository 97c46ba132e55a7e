import path from 'node:path';
import { fileURLToPath } from 'node:url';

/** Top folder of the checkout. */
export const root = path.dirname(path.dirname(fileURLToPath(import.meta.url)));

// Runs beside the installation of packages: node's own modules only.
import { CHROMIUM, installDebian, POPPLER, POSTGRESQL } from './debian.mjs';
import { withSentences } from './refusal.mjs';

await withSentences(() => installDebian(POSTGRESQL, CHROMIUM, POPPLER));

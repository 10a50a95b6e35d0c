/** `npm run bench:element`: how large and how quick the element is, in medians. */
import { runTool } from './support/tool.mjs';

await runTool('bench', process.argv.slice(2));

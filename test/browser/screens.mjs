/**
 * `npm run screens`: pictures of every state of the element, at 1440 and 390 px, light and dark, in
 * `.headtree/screens`. `npm run screens -- fail` takes those whose name holds that word.
 */
import { runTool } from './support/tool.mjs';

await runTool('screens', process.argv.slice(2));

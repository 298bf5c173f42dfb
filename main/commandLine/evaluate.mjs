// `npm run --silent evaluate -- FILE.json`: builds once when sources changed, then runs the built command.
import { ensureBuilt } from './build.mjs';

await ensureBuilt(['commandLine']);
const { run } = await import(new URL('../../dist/commandLine/evaluate.js', import.meta.url).href);
process.exitCode = await run(process.argv.slice(2));

// `npm run bench [name …]`: one JSON line a figure.
import type { Figure } from './figure.ts';
import { run as frontPage } from './front-page.ts';
import { run as planFit } from './plan-fit.ts';
import { run as planRoute } from './plan-route.ts';
import { run as startDevelopment } from './start-development.ts';
import { run as start } from './start.ts';

const benches: Record<string, () => Promise<Figure[]>> = {
  'plan-fit': planFit,
  'plan-route': planRoute,
  'front-page': frontPage,
  start,
  'start-development': startDevelopment,
};
const wanted = process.argv.slice(2);

for (const [name, run] of Object.entries(benches)) {
  if (wanted.length > 0 && !wanted.includes(name)) continue;
  for (const figure of await run()) console.log(JSON.stringify(figure));
}
process.exit(0);

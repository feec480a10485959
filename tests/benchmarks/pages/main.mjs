/*
 * `npm run bench:pages`: every page of the product in production mode on loopback with the demo in it, opened five times
 * by the right person with an empty cache. Printed for each: the median time from the start of navigation until its main
 * control can be used (seen, enabled, and listened to by React), the server's time, and the compressed bytes of script.
 * The last line is one JSON object.
 */
import { register } from 'tsx/esm/api';
import { withHalfmark } from '../with-halfmark.mjs';

register();
await withHalfmark(async () => {
  const { measurePages } = await import('./measure-pages.ts');
  const rows = await measurePages();
  console.table(
    rows.map(({ page, usable, server, script, mathematics }) => ({
      page,
      'usable ms': usable,
      'server ms': server,
      'script kB': script,
      KaTeX: mathematics,
    })),
  );
  const slowest = rows.reduce((most, row) => (row.usable > most.usable ? row : most));
  const figures = {
    pages: rows.length,
    slowest_page: slowest.page,
    slowest_usable_ms: slowest.usable,
    over_1000_ms: rows.filter(({ usable }) => usable >= 1000).length,
    most_script_kb: Math.max(...rows.map(({ script }) => script)),
  };
  console.log(JSON.stringify({ bench: 'pages', figures }));
});

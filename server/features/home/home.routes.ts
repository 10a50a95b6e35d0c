import type { Check } from '../../engine/checks/check';
import type { Route } from '../../middleware/route';
import { escaped, page } from '../page';

/** What stands at the door while the console is not built: the name, the way in, the cautions. */
export const homeRoutes = (checks: readonly Check[]): Route[] => {
  const lines = checks.map(({ id, title }) => `<li>${escaped(title)} <code>${id}</code></li>`);
  const answer = page(
    'Member checks for temporary works',
    `<h1>Headtree</h1>
<p>A member check service for temporary works: one governed answer for spreadsheets, scripts and
intranet pages.</p>
<p class="quiet">The console is not built: <code>npm start</code> builds it and says why when it
cannot. The API serves all the same.</p>
<h2>Checks</h2>
<ul>
${lines.join('\n')}
</ul>
<h2>For developers</h2>
<ul>
<li><a href="/docs/">API documentation</a></li>
<li><a href="/v1/openapi.json">The contract</a>, OpenAPI 3.1</li>
<li><a href="/problems">Problems</a> and what to do about them</li>
</ul>
<h2>Before you rely on a result</h2>
<p>Results are for competent persons. They cover only the verifications that they list; what a check
does not cover is listed in its own answer. Local codes, the firm’s procedures and licensed practice
prevail. A result that is <em>fail</em>, <em>incomplete</em> or <em>provisional</em> is not a
pass.</p>`,
  );
  return [
    {
      method: 'get',
      path: '/',
      policy: { kind: 'public' },
      rate: 'free',
      logged: false,
      handler: () => answer,
    },
  ];
};

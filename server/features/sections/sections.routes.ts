import { findSection, similarSections } from '../../engine/sections/catalogue';
import { revalidated } from '../../middleware/etag';
import { pageOf, readPage } from '../../middleware/page';
import { Problem } from '../../middleware/problem';
import type { Route } from '../../middleware/route';
import { toSection } from './section';
import { families, searchSections, shapes } from './section-search';

const shared = {
  method: 'get',
  policy: {
    kind: 'key',
    scope: 'catalogue',
    keyKinds: ['secret', 'page'],
    permission: 'catalogue:read',
  },
  rate: 'counted',
  logged: true,
} as const;

/** The catalogue of sections, with properties computed from their dimensions. */
export const sectionRoutes = (): Route[] => [
  {
    ...shared,
    path: '/v1/sections',
    query: {
      search: 'text',
      family: families,
      shape: shapes,
      pageSize: 'text',
      pageToken: 'text',
    },
    handler: ({ request, query }) => {
      const found = searchSections((query.search ?? '').slice(0, 60), query);
      const place = (mark: string): number =>
        found.findIndex(({ designation }) => designation === mark);
      const { size, after } = readPage(query, (mark) => place(mark) >= 0);
      const from = after === undefined ? 0 : place(after) + 1;
      const rows = found.slice(from, from + size + 1);
      const { items, nextPageToken } = pageOf(rows, size, ({ designation }) => designation);
      return revalidated(request, { items: items.map(toSection), nextPageToken });
    },
  },
  {
    ...shared,
    path: '/v1/sections/:designation',
    handler: ({ request, params }) => {
      const asked = (params.designation ?? '').slice(0, 60);
      const entry = findSection(asked);
      if (entry) return revalidated(request, toSection(entry));
      const near = similarSections(asked).join(', ');
      throw new Problem('not-found', `There is no such section. Near to it: ${near}.`);
    },
  },
];

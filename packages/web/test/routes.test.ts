import type { RouteObject } from 'react-router-dom';
import { expect, it } from 'vitest';
import { paths } from '../src/app/paths';
import { routes } from '../src/app/route-table';

/** The addresses of all pages in the route table; what only frames or redirects has no script of its own. */
function pagesOf(table: readonly RouteObject[], base = ''): string[] {
  return table.flatMap((route) => {
    const path = route.path?.startsWith('/')
      ? route.path
      : `${base}/${route.path ?? ''}`.replace(/\/+/g, '/');
    if (route.children) return pagesOf(route.children, path);
    return route.handle?.script ? [path.replace(/(.)\/$/, '$1')] : [];
  });
}

// The browser checks visit every page by this list: one that is missing here would go unseen.
it('gives every page of the route table its path by name', () => {
  const pages = pagesOf(routes).filter((path) => !path.endsWith('*'));
  const named = Object.values(paths).map((path) =>
    typeof path === 'string' ? path : path(':studyId', ':optionId'),
  );
  const plain = (path: string) => decodeURIComponent(path).split('?')[0]?.replace(/:\w+/g, ':id');
  expect(new Set(named.map(plain))).toEqual(new Set(pages.map(plain)));
});

import * as library from './public-api';

it('gives these names and no others; whoever depends on the library depends on this list', () => {
  expect(Object.keys(library).sort()).toEqual([
    'ApiClient',
    'ApiError',
    'HEADTREE_CSRF_TOKEN',
    'HEADTREE_FETCH',
    'WalerCheck',
    'adoptSheetStyles',
    'awayError',
    'errorOf',
    'isSecretKey',
    'secretKeyError',
    'sheetStyles',
  ]);
});

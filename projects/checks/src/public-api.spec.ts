import * as library from './public-api';

it('gives these names and no others; whoever depends on the library depends on this list', () => {
  expect(Object.keys(library).sort()).toEqual([
    'ApiClient',
    'ApiError',
    'EnvelopeDiagram',
    'HEADTREE_CSRF_TOKEN',
    'HEADTREE_FETCH',
    'MemberDrawing',
    'ReactionsTable',
    'StatusMark',
    'TitleBlock',
    'UtilisationBar',
    'WalerCheck',
    'WorkingSheet',
    'adoptSheetStyles',
    'barTone',
    'drawingModel',
    'fontFamilies',
    'isSecretKey',
    'provideSheetStyles',
    'sheetStyles',
  ]);
});

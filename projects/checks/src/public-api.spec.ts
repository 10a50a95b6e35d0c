import * as library from './public-api';

it('gives these names and no others; whoever depends on the library depends on this list', () => {
  expect(Object.keys(library).sort()).toEqual([
    'ApiClient',
    'ApiError',
    'EnvelopeDiagram',
    'HEADTREE_CSRF_TOKEN',
    'HEADTREE_FETCH',
    'InteractionDiagram',
    'MemberDrawing',
    'PointsTable',
    'ReactionsTable',
    'SectionCheck',
    'SectionDrawing',
    'StatusMark',
    'StressCheck',
    'StressDrawing',
    'TitleBlock',
    'UtilisationBar',
    'WalerCheck',
    'WorkingSheet',
    'adoptSheetStyles',
    'answeredSection',
    'barTone',
    'drawingModel',
    'fontFamilies',
    'isSecretKey',
    'provideSheetStyles',
    'sheetStyles',
  ]);
});

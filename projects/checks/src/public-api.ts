/** What the library gives to the elements and the console; a change here is on purpose. */
export * from './api/api-client';
export * from './api/api-error';
export type * from './contract';
export { adoptSheetStyles, sheetStyles } from './look/sheet-styles';
export { WalerCheck } from './waler-check/waler-check';

/** Publications that profile values were read in, by short key. */
export const sources = {
  MSB03: 'Steel Buildings in Europe, Multi-Storey Steel Buildings, Part 3: Actions (CTICM and SCI)',
  MSB10: 'Steel Buildings in Europe, Multi-Storey Steel Buildings, Part 10 (CTICM and SCI)',
  'ICE-T2': 'ICE Proceedings paper, Table 2 (quoting BSI 2011 factors)',
  PK: 'Porteous and Kermani, Structural Timber Design to Eurocode 5',
  'BB-UK': 'SCI P363, Steel Building Design: Design Data, explanatory notes (UK NA)',
  'BS5975-19': 'BS 5975:2019 (extract)',
  EC7A: 'EN 1997-1:2004 Annex A tables (reproduction)',
  MEM: 'from memory, unconfirmed',
} as const;

export type SourceKey = keyof typeof sources;

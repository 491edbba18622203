/** Documents that a fabricator numbers, each in a series without gaps. */
export const documentKinds = { order: '', dispatch: 'DIS', invoice: 'INV', receipt: 'REC' } as const;
export type DocumentKind = keyof typeof documentKinds;

/** The number as it stands on paper: `NM-000042` an order, `NM-INV000042` an invoice. */
export function documentNumber(prefix: string, kind: DocumentKind, sequence: number): string {
  return `${prefix}-${documentKinds[kind]}${String(sequence).padStart(6, '0')}`;
}

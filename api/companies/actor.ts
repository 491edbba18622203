import { type CompanyKind, type Role } from '@shared/contracts/session';

/** Someone signed in, as use cases see them. */
export interface Member {
  personId: string;
  sessionId: string;
  name: string;
  email: string;
  roles: readonly Role[];
  companyId: string;
  companyKind: CompanyKind;
  companyName: string;
  timeZone: string;
  /** orders above this wait for the dealer admin; null: no limit */
  orderLimitMinor: number | null;
}

/** A visitor is nobody yet. */
export type Actor = Member | null;

export function holds(member: Member, ...wanted: Role[]): boolean {
  return wanted.some((role) => member.roles.includes(role));
}

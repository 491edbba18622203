/** Which version of a list holds when. Instants are UTC epoch milliseconds. */

export interface Dated {
  /** null while a draft */
  effectiveFrom: number | null;
}

/** The version in force at `at`: of the published ones that have begun, the one that began last. */
export function versionInForce<Version extends Dated>(versions: readonly Version[], at: number): Version | undefined {
  let found: Version | undefined;
  for (const version of versions) {
    if (version.effectiveFrom === null || version.effectiveFrom > at) continue;
    if (!found || version.effectiveFrom >= (found.effectiveFrom ?? 0)) found = version;
  }
  return found;
}

/**
 * Why a version may not be published with effect from `effectiveFrom`; null when it may. Nothing is
 * published into the past, so that a price at an instant never changes afterwards, and no two
 * versions begin at once.
 */
export function findPublishingProblem(effectiveFrom: number, now: number, published: readonly Dated[]): string | null {
  if (effectiveFrom < now) return 'a list cannot take effect in the past';
  if (published.some((version) => version.effectiveFrom === effectiveFrom)) return 'another version takes effect at the same instant';
  return null;
}

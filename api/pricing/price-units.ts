import { type priceLinesEndpoint } from '@shared/contracts/bench';
import { type AnswerOf } from '@shared/contracts/endpoint';
import { type Reason } from '@shared/contracts/evaluation';
import { type Offer, type PriceRequest } from '@shared/contracts/prices';
import { pointer, Refusal } from '@shared/contracts/problems';
import { demandPossible } from '../catalogue/demand-possible';
import { type Member } from '../companies/actor';
import { type TradeAccountRow } from '../companies/company-store';
import { type Dependencies } from '../dependencies';
import { type Input } from '../http/serve';
import { type CheckedUnit, checkUnits } from './check-units';
import { type Circumstances, circumstancesOf } from './circumstances-of';
import { totalsToWire } from './engine/rows-to-wire';
import { totalOrder } from './engine/total-order';
import { findOpenAccount } from './find-open-account';
import { priceLinesAt } from './price-lines-at';

type Needs = Pick<Dependencies, 'stores' | 'catalogue'>;

/** One account with all that its offer is made from. */
type Asked = Circumstances & { account: TradeAccountRow };

/**
 * Offers for the same lines from every fabricator with whom the dealer has an open trade account,
 * or from the one named, each in its own currency, with the list in force at an instant. A maker
 * that cannot build them, or has no price for them, says why and gives no price.
 *
 * @throws Refusal `not-found` for an account that is not the dealer's, `account-not-open`,
 *   `no-price-list` when one account is named and its maker has no list in force, `invalid` at the field
 */
export function priceUnits(
  actor: Member,
  { body }: Pick<Input<typeof priceLinesEndpoint>, 'body'>,
  { stores, catalogue, clock }: Needs & Pick<Dependencies, 'clock'>,
): AnswerOf<typeof priceLinesEndpoint> {
  const at = body.at === undefined ? clock() : Date.parse(body.at);
  const accounts =
    body.tradeAccount === undefined
      ? stores.companies.openAccountsOfDealer(actor.companyId)
      : [findOpenAccount(actor, body.tradeAccount, stores)];
  demandPossible(
    body.lines.map(({ unit }, i) => ({ unit, pointer: pointer('lines', i, 'unit') })),
    catalogue(),
  );

  const asked = accounts.map((account): Asked => ({ account, ...circumstancesOf(account, body, at, stores) }));
  demandKnown(body, asked);
  const [only] = asked;
  if (body.tradeAccount !== undefined && only && !only.version) {
    throw new Refusal('no-price-list', `${only.account.fabricatorName} has no price list in force at that time.`, [
      { pointer: '/tradeAccount', detail: 'its maker has no price list in force at that time' },
    ]);
  }
  const checked = checkUnits(
    body.lines.map(({ unit }) => unit),
    catalogue(),
  );
  return {
    offers: asked.map((one) => offerOf(one, body, checked, { stores, catalogue })),
    pricedAt: new Date(at).toISOString(),
  };
}

/** A class or code that none of the makers asked knows is a slip of the pen. */
function demandKnown({ leadTimeClass, promotionCode }: PriceRequest, asked: readonly Asked[]): void {
  if (asked.length === 0) return;
  if (leadTimeClass !== undefined && asked.every(({ leadTimeDays }) => leadTimeDays === null)) {
    throw unknownField('/leadTimeClass', `no maker asked has a lead time called “${leadTimeClass}”`);
  }
  if (promotionCode !== undefined && !asked.some(({ terms }) => terms.promotions.some(({ code }) => code === promotionCode))) {
    throw unknownField('/promotionCode', 'no maker asked has a promotion with this code on this day');
  }
}

const unknownField = (at: string, detail: string) => new Refusal('invalid', `${at}: ${detail}`, [{ pointer: at, detail }]);

function offerOf(
  { account, leadTimeDays, version, terms, destination }: Asked,
  { lines, leadTimeClass }: PriceRequest,
  checked: readonly CheckedUnit[],
  { catalogue }: Needs,
): Offer {
  const head = {
    tradeAccount: account.id,
    fabricator: { id: account.fabricatorId, name: account.fabricatorName },
    currency: account.currency,
    priceListVersion: version?.version ?? null,
    priceList: version ? { name: version.name, effectiveFrom: version.effectiveFrom } : null,
  };
  const without = (reasons: Offer['reasons']): Offer => ({ ...head, canBuild: false, reasons, leadTimeDays: null, lines: [] });

  if (!version) return without([wholeOffer('no-price-list', 'has no price list in force at that time', 'a list in force', 'none', '/at')]);
  if (leadTimeDays === null) {
    return without([
      wholeOffer('no-lead-time', 'has no such lead time', 'lead times of this maker', leadTimeClass ?? 'none', '/leadTimeClass'),
    ]);
  }
  const maker = catalogue().fabricators.find(({ id }) => id === account.fabricatorId);
  if (!maker) throw new Error(`no fabricator ${account.fabricatorId}`);
  const answer = priceLinesAt(lines, checked, maker, version, terms, catalogue());
  if ('reasons' in answer) return without(answer.reasons);
  const total = totalOrder(
    answer.lines.map(({ priced }) => priced),
    version,
    destination,
    leadTimeClass ?? null,
  );
  if ('refusals' in total) return without(total.refusals.map((reason) => ({ ...reason, line: 0 })));
  return {
    ...head,
    canBuild: true,
    reasons: [],
    leadTimeDays,
    lines: answer.lines.map(({ sheet }) => sheet),
    ...totalsToWire(total.totalled),
  };
}

/** A reason that holds for all lines alike; it stands at the first. Its pointer is into the request. */
const wholeOffer = (code: string, detail: string, limit: string, actual: string, at: string): Reason & { line: number } => ({
  code,
  detail,
  limit,
  actual,
  nearest: null,
  nearestValue: null,
  pointer: at,
  line: 0,
});

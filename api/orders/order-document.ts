import { termsText } from '@shared/calendar/terms';
import { type orderPdf as orderPdfEndpoint } from '@shared/contracts/orders';
import { Refusal } from '@shared/contracts/problems';
import { money } from '@shared/money/money';
import { type Member } from '../companies/actor';
import { type ShipTo } from '../database/schema/orders';
import { type Dependencies } from '../dependencies';
import { type AcknowledgementDocument, type Party } from '../documents/document-models';
import { renderAcknowledgementPdf } from '../documents/render-acknowledgement-pdf';
import { type FileAnswer, type Input } from '../http/serve';
import { accountOf } from './order-checks';
import { type ReadOrderRow } from './order-store';

/** The acknowledgement of an order that the reader's company is a party of. @throws Refusal `not-found` */
export async function orderPdf(
  actor: Member,
  { params }: Pick<Input<typeof orderPdfEndpoint>, 'params'>,
  dependencies: Dependencies,
): Promise<FileAnswer> {
  const found = dependencies.stores.orders.read(actor.companyId, params.id);
  if (!found) throw new Refusal('not-found', 'There is no such order of yours.');
  return { fileName: `${found.order.number}.pdf`, bytes: await renderAcknowledgementPdf(orderDocument(found, dependencies)) };
}

/** An order as its acknowledgement says it, in the maker's name; the same for both sides. */
export function orderDocument(
  { order, dealerName, placedByName }: ReadOrderRow,
  { stores, catalogue }: Pick<Dependencies, 'stores' | 'catalogue'>,
): AcknowledgementDocument {
  const maker = stores.orders.maker(order.fabricatorId);
  const account = accountOf(order.tradeAccountId, { stores });
  const { lines, email, phone } = maker.letterhead;
  return {
    sender: { name: maker.name, lines, email, phone },
    number: order.number,
    at: order.placedAt,
    locale: maker.locale,
    timeZone: maker.timeZone,
    measureSystem: maker.measureSystem,
    dealer: { name: dealerName, lines: stores.companies.company(order.dealerId)?.letterhead.lines ?? [] },
    shipTo: shipToParty(order.shipTo),
    poNumber: order.poNumber,
    placedBy: placedByName,
    requiredOn: order.requiredOn,
    promisedOn: order.promisedOn,
    terms: order.payment === 'card' ? 'card' : termsText(account.terms),
    catalogue: catalogue(),
    lines: stores.orders.linesOf(order.id).map(({ position, tag, unit, makeUp, quantity, unitPriceMinor, linePriceMinor }) => ({
      position,
      tag,
      unit,
      makeUp,
      quantity,
      unitPrice: money(unitPriceMinor, order.currency),
      linePrice: money(linePriceMinor, order.currency),
    })),
    totals: order.totals,
  };
}

/** A ship-to as it stands on paper. */
export function shipToParty({ label, lines, town, region, postcode, country }: ShipTo): Party {
  return { name: label, lines: [...lines, `${town}, ${region} ${postcode}`, country] };
}

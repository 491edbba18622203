import * as bench from './bench';
import { type Endpoint } from './endpoint';
import * as orders from './orders';
import * as quotes from './quotes';
import * as receivables from './receivables';
import * as session from './session';
import * as system from './system';
import * as tradeAccounts from './trade-accounts';

/** Every endpoint there is, in the order of the OpenAPI text. */
export const endpoints = [
  system.readHealth,
  system.readOpenApi,
  session.signIn,
  session.me,
  session.signOut,
  session.listSessions,
  session.revokeSession,
  bench.readCatalogue,
  bench.evaluateUnitEndpoint,
  bench.priceLinesEndpoint,
  tradeAccounts.listTradeAccounts,
  tradeAccounts.readCredit,
  tradeAccounts.listMovements,
  tradeAccounts.changeCredit,
  tradeAccounts.listAddresses,
  tradeAccounts.listCompanies,
  quotes.createQuote,
  quotes.listQuotes,
  quotes.readQuote,
  quotes.changeQuote,
  quotes.addQuoteLines,
  quotes.changeQuoteLines,
  quotes.previewRePrice,
  quotes.rePriceQuote,
  quotes.quotePdf,
  quotes.mailQuote,
  orders.placeOrder,
  orders.listOrders,
  orders.readOrder,
  orders.moveOrder,
  orders.dispatchOrder,
  orders.orderPdf,
  receivables.listInvoices,
  receivables.readInvoice,
  receivables.invoicePdf,
  receivables.recordReceipt,
  receivables.listReceipts,
  receivables.readReceipt,
  receivables.applyReceipt,
  receivables.reverseAllocation,
  receivables.reverseReceipt,
  receivables.readTrialBalance,
] as const satisfies readonly Endpoint[];

export type EndpointId = (typeof endpoints)[number]['id'];

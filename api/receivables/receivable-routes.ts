import {
  applyReceipt as applyReceiptEndpoint,
  invoicePdf as invoicePdfEndpoint,
  listInvoices as listInvoicesEndpoint,
  listReceipts as listReceiptsEndpoint,
  readInvoice as readInvoiceEndpoint,
  readReceipt as readReceiptEndpoint,
  readTrialBalance as readTrialBalanceEndpoint,
  recordReceipt as recordReceiptEndpoint,
  reverseAllocation as reverseAllocationEndpoint,
  reverseReceipt as reverseReceiptEndpoint,
} from '@shared/contracts/receivables';
import {
  changeCredit as changeCreditEndpoint,
  listMovements as listMovementsEndpoint,
  readCredit as readCreditEndpoint,
} from '@shared/contracts/trade-accounts';
import { type Route, serve } from '../http/serve';
import { applyReceipt } from './apply-receipt';
import { changeCredit } from './change-credit';
import { invoicePdf } from './invoice-document';
import { listInvoices } from './list-invoices';
import { listMovements } from './list-movements';
import { readCredit } from './read-credit';
import { readInvoice } from './read-invoice';
import { listReceipts, readReceipt } from './read-receipt';
import { readTrialBalance } from './read-trial-balance';
import { recordReceipt } from './record-receipt';
import { reverseAllocation } from './reverse-allocation';
import { reverseReceipt } from './reverse-receipt';

export const receivableRoutes: Route[] = [
  serve(readCreditEndpoint, readCredit),
  serve(listMovementsEndpoint, listMovements),
  serve(changeCreditEndpoint, changeCredit),
  serve(listInvoicesEndpoint, listInvoices),
  serve(readInvoiceEndpoint, readInvoice),
  serve(invoicePdfEndpoint, invoicePdf),
  serve(recordReceiptEndpoint, recordReceipt),
  serve(listReceiptsEndpoint, listReceipts),
  serve(readReceiptEndpoint, readReceipt),
  serve(applyReceiptEndpoint, applyReceipt),
  serve(reverseAllocationEndpoint, reverseAllocation),
  serve(reverseReceiptEndpoint, reverseReceipt),
  serve(readTrialBalanceEndpoint, readTrialBalance),
];

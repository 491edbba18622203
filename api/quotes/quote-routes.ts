import * as quotes from '@shared/contracts/quotes';
import { type Route, serve } from '../http/serve';
import { addQuoteLines } from './add-quote-lines';
import { changeQuote } from './change-quote';
import { changeQuoteLines } from './change-quote-lines';
import { createQuote } from './create-quote';
import { listQuotes } from './list-quotes';
import { mailQuote } from './mail-quote';
import { previewRePrice } from './preview-re-price';
import { quotePdf } from './quote-pdf';
import { rePriceQuote } from './re-price-quote';
import { readQuote } from './read-quote';

export const quoteRoutes: Route[] = [
  serve(quotes.createQuote, createQuote),
  serve(quotes.listQuotes, listQuotes),
  serve(quotes.readQuote, readQuote),
  serve(quotes.changeQuote, changeQuote),
  serve(quotes.addQuoteLines, addQuoteLines),
  serve(quotes.changeQuoteLines, changeQuoteLines),
  serve(quotes.previewRePrice, previewRePrice),
  serve(quotes.rePriceQuote, rePriceQuote),
  serve(quotes.quotePdf, quotePdf),
  serve(quotes.mailQuote, mailQuote),
];

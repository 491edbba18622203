import { catalogueSchema } from './catalogue';
import { endpoint } from './endpoint';
import { evaluateRequest, evaluationSchema } from './evaluation';
import { priceAnswer, priceRequest } from './prices';

/** What the Bench calls. */

export const readCatalogue = endpoint({
  id: 'catalogue.read',
  method: 'GET',
  path: '/api/catalogue',
  summary: 'Glasses, coatings, treatments, spacers, gases, grids, shapes, edge work and the makers',
  status: 200,
  answer: catalogueSchema,
});

export const evaluateUnitEndpoint = endpoint({
  id: 'units.evaluate',
  method: 'POST',
  path: '/api/units/evaluate',
  summary: 'Engineering of a unit, and who can build it; SI units',
  body: evaluateRequest,
  status: 200,
  answer: evaluationSchema,
});

export const priceLinesEndpoint = endpoint({
  id: 'prices.price',
  method: 'POST',
  path: '/api/prices',
  summary: 'Offers from every fabricator with an open trade account, or from the one named',
  body: priceRequest,
  status: 200,
  answer: priceAnswer,
});

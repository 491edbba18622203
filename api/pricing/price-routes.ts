import { priceLinesEndpoint } from '@shared/contracts/bench';
import { type Route, serve } from '../http/serve';
import { priceUnits } from './price-units';

export const priceRoutes: Route[] = [serve(priceLinesEndpoint, priceUnits)];

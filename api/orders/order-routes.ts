import {
  dispatchOrder as dispatchOrderEndpoint,
  listOrders as listOrdersEndpoint,
  moveOrder as moveOrderEndpoint,
  orderPdf as orderPdfEndpoint,
  placeOrder as placeOrderEndpoint,
  readOrder as readOrderEndpoint,
} from '@shared/contracts/orders';
import { type Route, serve } from '../http/serve';
import { dispatchOrder } from './dispatch-order';
import { listOrders } from './list-orders';
import { moveOrder } from './move-order';
import { orderPdf } from './order-document';
import { placeOrder } from './place-order';
import { readOrder } from './read-order';

export const orderRoutes: Route[] = [
  serve(placeOrderEndpoint, placeOrder),
  serve(listOrdersEndpoint, listOrders),
  serve(readOrderEndpoint, readOrder),
  serve(moveOrderEndpoint, moveOrder),
  serve(dispatchOrderEndpoint, dispatchOrder),
  serve(orderPdfEndpoint, orderPdf),
];

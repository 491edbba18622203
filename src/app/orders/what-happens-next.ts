import { type Order } from '@shared/contracts/orders';

/** What an order waits for, in a sentence, for the dealer or the fabricator who reads it. */
export function whatHappensNext(
  order: Pick<Order, 'state' | 'dealer' | 'fabricator' | 'units' | 'dispatchedUnits'>,
  side: 'dealer' | 'fabricator',
): string {
  const maker = side === 'dealer' ? order.fabricator.name : 'you';
  const left = order.units - order.dispatchedUnits;
  const some = order.dispatchedUnits > 0 ? ` ${order.dispatchedUnits} of ${order.units} units are on their way; ${left} are left.` : '';
  switch (order.state) {
    case 'awaiting approval':
      return side === 'dealer'
        ? 'The order is above its buyer’s limit. It waits for a dealer admin of your company; until then nothing is made and no credit is bound.'
        : `The order waits for approval at ${order.dealer.name}.`;
    case 'credit review':
      return side === 'dealer'
        ? `The credit does not reach. ${maker} looks at the account and releases the order or refuses it; until then nothing is made and no credit is bound.`
        : 'The credit of the account does not reach. A clerk releases the order or refuses it with a reason.';
    case 'awaiting payment':
      return 'The order waits for its payment.';
    case 'submitted':
      return side === 'dealer' ? `${maker} has the order and will accept it.` : `${order.dealer.name} waits for the order to be accepted.`;
    case 'accepted':
      return side === 'dealer'
        ? `${maker} has accepted the order. It can be cancelled until production starts.${some}`
        : `Ready to be made.${some}`;
    case 'in production':
      return `The units are being made.${some}`;
    case 'ready':
      return `The units are ready to leave.${some}`;
    case 'dispatched':
      return side === 'dealer' ? 'Every unit is on its way. Confirm the delivery when the units are there.' : 'Every unit is on its way.';
    case 'delivered':
      return 'The units are delivered.';
    case 'closed':
      return 'The order is done.';
    case 'cancelled':
      return 'The order is cancelled; nothing will be made. The history says why.';
    case 'refused':
      return 'The order was refused; nothing will be made. The history says why.';
  }
}

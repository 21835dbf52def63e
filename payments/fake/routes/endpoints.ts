import type { Endpoint } from '../http/endpoint'
import { accountLinkEndpoints } from './account-links'
import { accountEndpoints } from './accounts'
import { balanceEndpoints } from './balance'
import { chargeEndpoints } from './charges'
import { checkoutSessionEndpoints } from './checkout-sessions'
import { disputeEndpoints } from './disputes'
import { eventEndpoints } from './events'
import { paymentIntentEndpoints } from './payment-intents'
import { refundEndpoints } from './refunds'
import { transferEndpoints } from './transfers'

/** Every call of the processor's API that is imitated. */
export const endpoints: readonly Endpoint[] = [
  ...accountEndpoints,
  ...accountLinkEndpoints,
  ...balanceEndpoints,
  ...chargeEndpoints,
  ...checkoutSessionEndpoints,
  ...disputeEndpoints,
  ...eventEndpoints,
  ...paymentIntentEndpoints,
  ...refundEndpoints,
  ...transferEndpoints,
]

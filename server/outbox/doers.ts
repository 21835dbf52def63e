import { applyProcessorEvent } from '@/server/money/apply-event'
import { captureDeposit } from '@/server/money/capture-deposit'
import { expirePaymentPage } from '@/server/money/expire-payment-page'
import { sendRefund } from '@/server/money/send-refund'
import { sendTransfer } from '@/server/money/send-transfer'
import { letAuthorisationGo } from '@/server/money/void-authorisation'
import { sendMail } from '@/server/mail/send-mail'
import { registerDoer } from '@/server/outbox/run-effects'

/** Who does which effect. */
export function registerDoers(): void {
  registerDoer('mail', sendMail)
  registerDoer('payment-event', applyProcessorEvent)
  registerDoer('capture-deposit', captureDeposit)
  registerDoer('void-authorisation', letAuthorisationGo)
  registerDoer('expire-checkout', expirePaymentPage)
  registerDoer('refund', sendRefund)
  registerDoer('transfer', sendTransfer)
}

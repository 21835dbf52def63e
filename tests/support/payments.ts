import { configurePayments } from '@/payments/stripe'
import { startTestFake, type TestFake } from '@/payments/fake/fake-for-tests'

/** The practice processor beside the server under test, with the SDK turned to it. */
export async function openPayments(): Promise<TestFake> {
  const fake = await startTestFake()
  configurePayments({
    secretKey: 'sk_test_farms',
    webhookSecret: 'whsec_farms',
    host: '127.0.0.1',
    port: fake.port,
    protocol: 'http',
  })
  return fake
}

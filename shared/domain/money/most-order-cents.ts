/** The most one order may come to, whole cents: $100,000. House rule; beyond it two people should talk first. */
export const mostOrderCents = 10_000_000

// The lazily loaded group of the moderation desk: one chunk, imported only through lazy().
export { ModerationHome } from './moderation-home'
export { NoShipDays } from './no-ship-days'
export { ReviewScreen } from './review-screen'

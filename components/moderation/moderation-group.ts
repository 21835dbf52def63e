// The lazily loaded group of the moderation desk: one chunk, imported only through lazy().
export { ReviewQueue } from './review-queue'
export { ReviewScreen } from './review-screen'

// The lazily loaded group of the moderation desk: one chunk, imported only through lazy().
export { ModerationHome } from './moderation-home'
export { ReviewScreen } from './review-screen'

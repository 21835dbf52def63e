// The lazily loaded group of the notices: one chunk, imported only through lazy().
export { NoticesHome } from './notices-home'

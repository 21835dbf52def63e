// The lazily loaded group: everything behind this module is one chunk, fetched when a map is first shown.
export { MapPicture } from './map-picture'

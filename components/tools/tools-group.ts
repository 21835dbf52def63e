// The calculators and the trip check as one lazily loaded group: they share the trip engine.
export { ToolScreen } from './tool-screen'
export { ToolsHome } from './tools-home'
export { AboutSources } from './about-sources'
export { TripCheck } from '@/components/trips/trip-check'
export { ListingShipping } from '@/components/trips/listing-shipping'
export { SeasonPage } from '@/components/trips/season-page'
export { ParcelPage } from '@/components/trips/parcel-page'
export { YourWater } from '@/components/water/your-water'

// The order screens as one lazily loaded group.
export { OrderPage } from './order-page'
export { OrdersHome } from './orders-home'
export { ReserveBatch } from '../reservations/reserve-batch'
export { ListingShipDays } from '../shipping/listing-ship-days'
export { RoutesHome } from '../routes/routes-home'

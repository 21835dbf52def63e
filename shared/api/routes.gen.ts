// Written by scripts/write-routes.mjs from shared/contracts; the contract test fails when it is out of step.
export interface Endpoints {
  dismissReports: typeof import('@/shared/contracts/listing-reports').dismissReports
  listReportedListings: typeof import('@/shared/contracts/listing-reports').listReportedListings
  reportListing: typeof import('@/shared/contracts/listing-reports').reportListing
  takeDownListing: typeof import('@/shared/contracts/listing-reports').takeDownListing
  adjustStock: typeof import('@/shared/contracts/listings').adjustStock
  beginListing: typeof import('@/shared/contracts/listings').beginListing
  changeSelling: typeof import('@/shared/contracts/listings').changeSelling
  cutHarvest: typeof import('@/shared/contracts/listings').cutHarvest
  discardDraft: typeof import('@/shared/contracts/listings').discardDraft
  listOwnListings: typeof import('@/shared/contracts/listings').listOwnListings
  readListing: typeof import('@/shared/contracts/listings').readListing
  readOwnListing: typeof import('@/shared/contracts/listings').readOwnListing
  saveDraft: typeof import('@/shared/contracts/listings').saveDraft
  submitListing: typeof import('@/shared/contracts/listings').submitListing
  changeMe: typeof import('@/shared/contracts/members').changeMe
  readMe: typeof import('@/shared/contracts/members').readMe
  decideReview: typeof import('@/shared/contracts/moderation').decideReview
  listReviews: typeof import('@/shared/contracts/moderation').listReviews
  readReview: typeof import('@/shared/contracts/moderation').readReview
  keepNoShipDay: typeof import('@/shared/contracts/no-ship-days').keepNoShipDay
  listNoShipDays: typeof import('@/shared/contracts/no-ship-days').listNoShipDays
  countUnreadNotices: typeof import('@/shared/contracts/notices').countUnreadNotices
  listNotices: typeof import('@/shared/contracts/notices').listNotices
  readAllNotices: typeof import('@/shared/contracts/notices').readAllNotices
  readNotice: typeof import('@/shared/contracts/notices').readNotice
  acceptOrder: typeof import('@/shared/contracts/order-acts').acceptOrder
  cancelOrder: typeof import('@/shared/contracts/order-acts').cancelOrder
  chooseSlot: typeof import('@/shared/contracts/order-acts').chooseSlot
  confirmGood: typeof import('@/shared/contracts/order-acts').confirmGood
  contestNoShow: typeof import('@/shared/contracts/order-acts').contestNoShow
  decideOrder: typeof import('@/shared/contracts/order-acts').decideOrder
  declineOrder: typeof import('@/shared/contracts/order-acts').declineOrder
  handOver: typeof import('@/shared/contracts/order-acts').handOver
  leaveReservation: typeof import('@/shared/contracts/order-acts').leaveReservation
  markReady: typeof import('@/shared/contracts/order-acts').markReady
  payBalance: typeof import('@/shared/contracts/order-acts').payBalance
  payDeposit: typeof import('@/shared/contracts/order-acts').payDeposit
  reportNoShow: typeof import('@/shared/contracts/order-acts').reportNoShow
  stopOrder: typeof import('@/shared/contracts/order-acts').stopOrder
  withdrawRequest: typeof import('@/shared/contracts/order-acts').withdrawRequest
  listOrders: typeof import('@/shared/contracts/orders').listOrders
  readOrder: typeof import('@/shared/contracts/orders').readOrder
  reserveBatch: typeof import('@/shared/contracts/orders').reserveBatch
  makePackingSheet: typeof import('@/shared/contracts/packing').makePackingSheet
  uploadPhoto: typeof import('@/shared/contracts/photos').uploadPhoto
  findPlaces: typeof import('@/shared/contracts/places').findPlaces
  answerSurvival: typeof import('@/shared/contracts/ratings').answerSurvival
  changeRating: typeof import('@/shared/contracts/ratings').changeRating
  hideRatingWords: typeof import('@/shared/contracts/ratings').hideRatingWords
  listRatings: typeof import('@/shared/contracts/ratings').listRatings
  rateOrder: typeof import('@/shared/contracts/ratings').rateOrder
  replyToRating: typeof import('@/shared/contracts/ratings').replyToRating
  countFacets: typeof import('@/shared/contracts/search').countFacets
  findPins: typeof import('@/shared/contracts/search').findPins
  listSellerListings: typeof import('@/shared/contracts/search').listSellerListings
  searchListings: typeof import('@/shared/contracts/search').searchListings
  changeFarm: typeof import('@/shared/contracts/sellers').changeFarm
  openFarm: typeof import('@/shared/contracts/sellers').openFarm
  readOwnFarm: typeof import('@/shared/contracts/sellers').readOwnFarm
  readSeller: typeof import('@/shared/contracts/sellers').readSeller
  startPayouts: typeof import('@/shared/contracts/sellers').startPayouts
  endOtherSessions: typeof import('@/shared/contracts/sessions').endOtherSessions
  endSession: typeof import('@/shared/contracts/sessions').endSession
  listSessions: typeof import('@/shared/contracts/sessions').listSessions
  agreeNewDay: typeof import('@/shared/contracts/ship-acts').agreeNewDay
  checkRoute: typeof import('@/shared/contracts/ship-acts').checkRoute
  checkRoutes: typeof import('@/shared/contracts/ship-acts').checkRoutes
  chooseShipDay: typeof import('@/shared/contracts/ship-acts').chooseShipDay
  declineNewDay: typeof import('@/shared/contracts/ship-acts').declineNewDay
  dispatchOrder: typeof import('@/shared/contracts/ship-acts').dispatchOrder
  holdForWeather: typeof import('@/shared/contracts/ship-acts').holdForWeather
  keepRoutePapers: typeof import('@/shared/contracts/ship-acts').keepRoutePapers
  listOrderShipDays: typeof import('@/shared/contracts/ship-acts').listOrderShipDays
  listRoutes: typeof import('@/shared/contracts/ship-acts').listRoutes
  printOrderPacking: typeof import('@/shared/contracts/ship-acts').printOrderPacking
  readMovement: typeof import('@/shared/contracts/ship-acts').readMovement
  readShipDays: typeof import('@/shared/contracts/ship-acts').readShipDays
  reportArrival: typeof import('@/shared/contracts/ship-acts').reportArrival
  reportLateArrival: typeof import('@/shared/contracts/ship-acts').reportLateArrival
  reportLateBox: typeof import('@/shared/contracts/ship-acts').reportLateBox
  printStatement: typeof import('@/shared/contracts/statements').printStatement
  readRecord: typeof import('@/shared/contracts/statements').readRecord
  readStatement: typeof import('@/shared/contracts/statements').readStatement
  readSeason: typeof import('@/shared/contracts/trips').readSeason
  readWayHome: typeof import('@/shared/contracts/trips').readWayHome
}

export const routes: Record<keyof Endpoints, readonly [method: string, path: string, upload: boolean]> = {
  dismissReports: ['POST', '/moderation/reported-listings/:listingId/dismissal', false],
  listReportedListings: ['GET', '/moderation/reported-listings', false],
  reportListing: ['POST', '/listings/:listingId/reports', false],
  takeDownListing: ['POST', '/moderation/reported-listings/:listingId/take-down', false],
  adjustStock: ['POST', '/sellers/mine/listings/:listingId/stock-movements', false],
  beginListing: ['POST', '/sellers/mine/listings', false],
  changeSelling: ['POST', '/sellers/mine/listings/:listingId/selling', false],
  cutHarvest: ['POST', '/listings/:listingId/harvest', false],
  discardDraft: ['DELETE', '/sellers/mine/listings/:listingId', false],
  listOwnListings: ['GET', '/sellers/mine/listings', false],
  readListing: ['GET', '/listings/:listingId', false],
  readOwnListing: ['GET', '/sellers/mine/listings/:listingId', false],
  saveDraft: ['PATCH', '/sellers/mine/listings/:listingId', false],
  submitListing: ['POST', '/sellers/mine/listings/:listingId/submission', false],
  changeMe: ['PATCH', '/me', false],
  readMe: ['GET', '/me', false],
  decideReview: ['POST', '/moderation/listings/:versionId/decision', false],
  listReviews: ['GET', '/moderation/listings', false],
  readReview: ['GET', '/moderation/listings/:versionId', false],
  keepNoShipDay: ['POST', '/moderation/no-ship-days', false],
  listNoShipDays: ['GET', '/moderation/no-ship-days', false],
  countUnreadNotices: ['GET', '/notices/unread-count', false],
  listNotices: ['GET', '/notices', false],
  readAllNotices: ['POST', '/notices/readings', false],
  readNotice: ['POST', '/notices/:noticeId/reading', false],
  acceptOrder: ['POST', '/orders/:orderId/acceptance', false],
  cancelOrder: ['POST', '/orders/:orderId/cancellation', false],
  chooseSlot: ['POST', '/orders/:orderId/slot', false],
  confirmGood: ['POST', '/orders/:orderId/confirmation', false],
  contestNoShow: ['POST', '/orders/:orderId/contest', false],
  decideOrder: ['POST', '/moderation/orders/:orderId/decision', false],
  declineOrder: ['POST', '/orders/:orderId/refusal', false],
  handOver: ['POST', '/orders/:orderId/hand-over', false],
  leaveReservation: ['POST', '/orders/:orderId/departure', false],
  markReady: ['POST', '/orders/:orderId/readiness', false],
  payBalance: ['POST', '/orders/:orderId/balance-payment', false],
  payDeposit: ['POST', '/orders/:orderId/deposit-payment', false],
  reportNoShow: ['POST', '/orders/:orderId/no-show', false],
  stopOrder: ['POST', '/moderation/orders/:orderId/stop', false],
  withdrawRequest: ['POST', '/orders/:orderId/withdrawal', false],
  listOrders: ['GET', '/orders', false],
  readOrder: ['GET', '/orders/:orderId', false],
  reserveBatch: ['POST', '/listings/:listingId/orders', false],
  makePackingSheet: ['POST', '/packing-sheet', false],
  uploadPhoto: ['POST', '/photos', true],
  findPlaces: ['GET', '/places', false],
  answerSurvival: ['POST', '/orders/:orderId/survival', false],
  changeRating: ['PATCH', '/orders/:orderId/rating', false],
  hideRatingWords: ['POST', '/moderation/ratings/:ratingId/hiding', false],
  listRatings: ['GET', '/sellers/:sellerId/ratings', false],
  rateOrder: ['POST', '/orders/:orderId/rating', false],
  replyToRating: ['POST', '/orders/:orderId/rating/reply', false],
  countFacets: ['GET', '/listing-facets', false],
  findPins: ['GET', '/listing-pins', false],
  listSellerListings: ['GET', '/sellers/:sellerId/listings', false],
  searchListings: ['GET', '/listings', false],
  changeFarm: ['PATCH', '/sellers/mine', false],
  openFarm: ['POST', '/sellers', false],
  readOwnFarm: ['GET', '/sellers/mine', false],
  readSeller: ['GET', '/sellers/:sellerId', false],
  startPayouts: ['POST', '/sellers/mine/payout-onboarding', false],
  endOtherSessions: ['DELETE', '/me/sessions', false],
  endSession: ['DELETE', '/me/sessions/:sessionId', false],
  listSessions: ['GET', '/me/sessions', false],
  agreeNewDay: ['POST', '/orders/:orderId/new-day', false],
  checkRoute: ['POST', '/orders/:orderId/route-check', false],
  checkRoutes: ['POST', '/routes/checks', false],
  chooseShipDay: ['POST', '/orders/:orderId/ship-day', false],
  declineNewDay: ['POST', '/orders/:orderId/new-day-refusal', false],
  dispatchOrder: ['POST', '/orders/:orderId/dispatch', false],
  holdForWeather: ['POST', '/orders/:orderId/weather-hold', false],
  keepRoutePapers: ['POST', '/orders/:orderId/route-papers', false],
  listOrderShipDays: ['GET', '/orders/:orderId/ship-days', false],
  listRoutes: ['GET', '/routes', false],
  printOrderPacking: ['GET', '/orders/:orderId/packing-sheet', false],
  readMovement: ['GET', '/orders/:orderId/movement-document', false],
  readShipDays: ['GET', '/listings/:listingId/ship-days', false],
  reportArrival: ['POST', '/orders/:orderId/arrival', false],
  reportLateArrival: ['POST', '/orders/:orderId/late-arrival', false],
  reportLateBox: ['POST', '/orders/:orderId/late-box', false],
  printStatement: ['GET', '/statements/:month/csv', false],
  readRecord: ['GET', '/record', false],
  readStatement: ['GET', '/statements/:month', false],
  readSeason: ['GET', '/season', false],
  readWayHome: ['GET', '/listings/:listingId/way-home', false],
}

/** Who asks, in the order of the columns below. `plain` staff have not set up their second factor. */
export const ROLES = [
  'anonymous',
  'member',
  'seller',
  'other-seller',
  'moderator',
  'admin',
  'plain-moderator',
  'plain-admin',
] as const
export type Role = (typeof ROLES)[number]

/**
 * `own`: of the member and the seller, `foreign`: of another member and the other seller. Orders are ended and
 * listings live (foreign ones hidden), so that a caller who gets past the guards meets a harmless 409.
 */
export type ObjectKind =
  | 'none'
  | 'notice'
  | 'order'
  | 'agreed-order'
  | 'own-listing'
  | 'public-listing'
  | 'version'
  | 'seller'
  | 'rating'
  | 'session'

export interface AccessRow {
  /** The contract's name, or method and path of a route outside the contracts. */
  route: string
  object: ObjectKind
  send?: object
  query?: string
  /** Expected statuses, a column a role; `missing` is an object that never was. */
  own?: string
  foreign?: string
  missing?: string
}

const NOTE = 'The gate was locked and nobody came.'
const WINDOW = 'A'.repeat(22)
const unknownZip = {
  farmName: 'Nowhere Farm',
  about: '',
  kind: 'hatchery',
  street: '1 Mill Lane',
  city: 'Nowhere',
  state: 'OH',
  zip: '00000',
  phone: '(513) 555-0142',
  licences: [{ state: 'OH', answer: 'not-needed' }],
}

const packing = { species: 'bluegill', count: 20, massG: 2, startC: 18, legs: [{ hours: 12, airC: 18 }] }

//               anon mem  sell oth  mod  adm  mod- adm-
const everybody = '200 200 200 200 200 200 200 200'
const signedIn = '401 200 200 200 200 200 200 200'
const nobody = '404 404 404 404 404 404 404 404'
const nobodySignedIn = '401 404 404 404 404 404 404 404'
const notForSellers = '401 403 404 404 403 403 403 403'
const staffOn = (ok: string, party = '403') => `401 403 403 403 ${ok} ${ok} ${party} ${party}`

/** An act of the buyer alone on an order that has ended; staff with a second factor read orders but are no party. */
const buyersAct = {
  object: 'order',
  own: '401 409 404 404 404 404 404 404',
  foreign: nobodySignedIn,
  missing: nobodySignedIn,
} as const
const sellersAct = {
  object: 'order',
  own: '401 404 409 404 404 404 404 404',
  foreign: '401 404 404 409 404 404 404 404',
  missing: nobodySignedIn,
} as const
/** An act of either party; staff are told that it is not theirs. */
const partysAct = {
  object: 'order',
  own: '401 409 409 404 403 403 404 404',
  foreign: '401 404 404 409 403 403 404 404',
  missing: nobodySignedIn,
} as const
const staffsAct = {
  object: 'order',
  own: staffOn('409'),
  foreign: staffOn('409'),
  missing: staffOn('404'),
} as const
const ownersAct = (ok: string) => ({
  object: 'own-listing' as const,
  own: `401 403 ${ok} 404 403 403 403 403`,
  foreign: `401 403 404 ${ok} 403 403 403 403`,
  missing: notForSellers,
})
const open = { object: 'none', own: everybody } as const

export const accessMatrix: AccessRow[] = [
  { route: 'readMe', ...open },
  { route: 'changeMe', object: 'none', send: {}, own: signedIn },
  { route: 'findPlaces', ...open, query: 'q=Cin' },
  { route: 'makePackingSheet', ...open, send: packing },
  { route: 'searchListings', ...open, query: 'near=45202' },
  { route: 'countFacets', ...open, query: 'near=45202' },
  { route: 'findPins', ...open, query: 'south=38&north=40&west=-86&east=-83&zoom=8' },
  { route: 'readListing', object: 'public-listing', own: everybody, foreign: nobody, missing: nobody },
  {
    route: 'readWayHome',
    object: 'public-listing',
    query: 'near=45202&day=2027-01-20',
    own: everybody,
    foreign: nobody,
    missing: nobody,
  },
  {
    route: 'readSeason',
    ...open,
    query: 'from=45202&to=40202&species=bluegill&packing=carton-overnight',
  },
  // These batches are collected only.
  {
    route: 'readShipDays',
    object: 'public-listing',
    query: 'near=45202&quantity=25',
    own: '409 409 409 409 409 409 409 409',
    foreign: nobody,
    missing: nobody,
  },
  { route: 'readSeller', object: 'seller', own: everybody, missing: nobody },
  { route: 'listSellerListings', object: 'seller', query: 'near=45202', own: everybody, missing: nobody },
  {
    route: 'reportListing',
    object: 'public-listing',
    send: { reason: 'unlawful' },
    own: '401 201 409 201 201 201 201 201',
    foreign: nobodySignedIn,
    missing: nobodySignedIn,
  },

  { route: 'openFarm', object: 'none', send: unknownZip, own: '401 422 422 422 422 422 422 422' },
  { route: 'readOwnFarm', object: 'none', own: '401 403 200 200 403 403 403 403' },
  { route: 'changeFarm', object: 'none', send: unknownZip, own: '401 403 422 422 403 403 403 403' },
  { route: 'startPayouts', object: 'none', own: '401 403 201 201 403 403 403 403' },
  { route: 'uploadPhoto', object: 'none', send: {}, own: '401 422 422 422 422 422 422 422' },

  { route: 'listOwnListings', object: 'none', own: '401 403 200 200 403 403 403 403' },
  { route: 'beginListing', object: 'none', send: {}, own: '401 403 201 201 403 403 403 403' },
  { route: 'readOwnListing', ...ownersAct('200') },
  { route: 'saveDraft', send: { draft: {}, draftRevision: 999 }, ...ownersAct('409') },
  { route: 'submitListing', send: { draftRevision: 999 }, ...ownersAct('409') },
  { route: 'changeSelling', send: { selling: 'live' }, ...ownersAct('200') },
  { route: 'discardDraft', ...ownersAct('409') },
  {
    route: 'adjustStock',
    send: { change: -1_000_000, reason: 'recount' },
    ...ownersAct('409'),
  },
  // The caller's listing is one of fish, whose orders are not cut by themselves.
  { route: 'cutHarvest', send: { count: 0 }, ...ownersAct('409') },

  {
    route: 'reserveBatch',
    object: 'public-listing',
    send: { quantity: 1, near: '45202', version: 1, ticked: [] },
    own: '401 409 409 409 409 409 409 409',
    foreign: nobodySignedIn,
    missing: nobodySignedIn,
  },
  { route: 'listOrders', object: 'none', query: 'as=seller', own: signedIn },
  {
    route: 'readOrder',
    object: 'order',
    own: '401 200 200 404 200 200 404 404',
    foreign: '401 404 404 200 200 200 404 404',
    missing: nobodySignedIn,
  },
  { route: 'payDeposit', ...buyersAct },
  { route: 'payBalance', ...buyersAct },
  { route: 'leaveReservation', ...buyersAct },
  { route: 'withdrawRequest', ...buyersAct },
  { route: 'confirmGood', ...buyersAct },
  { route: 'acceptOrder', ...sellersAct },
  { route: 'declineOrder', send: { reason: 'sick' }, ...sellersAct },
  { route: 'markReady', ...sellersAct },
  { route: 'handOver', send: { code: '000000', count: 25 }, ...sellersAct },
  { route: 'cancelOrder', send: { reason: 'die-off' }, ...partysAct },
  { route: 'chooseSlot', send: { windowId: WINDOW }, ...partysAct },
  { route: 'reportNoShow', send: { note: NOTE }, ...partysAct },
  { route: 'contestNoShow', send: { note: NOTE }, ...partysAct },
  { route: 'stopOrder', send: { cause: 'fraud', animals: 'free', note: NOTE }, ...staffsAct },
  { route: 'decideOrder', send: { outcome: 'handed-over', note: NOTE }, ...staffsAct },

  // These orders are collected and over: whoever gets past the guards meets a 409.
  {
    route: 'listOrderShipDays',
    object: 'order',
    own: '401 409 409 404 409 409 404 404',
    foreign: '401 404 404 409 409 409 404 404',
    missing: nobodySignedIn,
  },
  {
    route: 'chooseShipDay',
    send: { shipDay: '2027-05-10' },
    object: 'order',
    own: '401 409 409 404 409 409 404 404',
    foreign: '401 404 404 409 409 409 404 404',
    missing: nobodySignedIn,
  },
  { route: 'checkRoute', ...sellersAct },
  { route: 'keepRoutePapers', send: { papers: [] }, ...sellersAct },
  { route: 'dispatchOrder', send: { tracking: '9400 1112', ticks: [] }, ...sellersAct },
  { route: 'printOrderPacking', ...sellersAct },
  { route: 'reportArrival', ...buyersAct },
  { route: 'reportLateBox', ...buyersAct },
  { route: 'reportLateArrival', send: { aliveCount: 25 }, ...buyersAct },
  // Nothing travelled: there is no such paper.
  {
    route: 'readMovement',
    object: 'order',
    own: nobodySignedIn,
    foreign: nobodySignedIn,
    missing: nobodySignedIn,
  },
  { route: 'holdForWeather', send: { why: 'Frost all week.' }, ...sellersAct },
  { route: 'agreeNewDay', send: {}, ...buyersAct },
  { route: 'declineNewDay', ...buyersAct },
  { route: 'readStatement', object: 'none', own: '401 403 200 200 403 403 403 403' },
  { route: 'printStatement', object: 'none', own: '401 403 200 200 403 403 403 403' },
  { route: 'readRecord', object: 'none', own: '401 403 200 200 403 403 403 403' },
  { route: 'listRoutes', object: 'none', own: '401 403 200 200 403 403 403 403' },
  {
    route: 'checkRoutes',
    object: 'none',
    send: { shipDay: '2027-05-10', hold: false },
    own: '401 403 200 200 403 403 403 403',
  },
  { route: 'listNoShipDays', object: 'none', own: staffOn('200') },
  {
    route: 'keepNoShipDay',
    object: 'none',
    send: { day: '2020-01-01', why: 'Long over', isOff: false },
    own: staffOn('422'),
  },

  { route: 'rateOrder', send: { marks: { fish: 5, count: 5, contact: 5 } }, ...buyersAct },
  // Nobody has rated these orders: there is nothing to change or to reply to.
  {
    route: 'changeRating',
    send: { marks: { fish: 5, count: 5, contact: 5 } },
    object: 'order',
    own: nobodySignedIn,
    missing: nobodySignedIn,
  },
  {
    route: 'replyToRating',
    send: { words: 'Thanks' },
    object: 'order',
    own: nobodySignedIn,
    missing: nobodySignedIn,
  },
  { route: 'answerSurvival', send: { alive: 20 }, ...buyersAct },
  { route: 'listRatings', object: 'seller', own: everybody, missing: nobody },
  {
    route: 'hideRatingWords',
    send: { part: 'words', reason: 'threats' },
    object: 'rating',
    missing: staffOn('404'),
  },

  { route: 'listSessions', object: 'none', own: signedIn },
  { route: 'endSession', object: 'session', missing: nobodySignedIn },
  { route: 'endOtherSessions', object: 'none', own: '401 204 204 204 204 204 204 204' },

  { route: 'listNotices', object: 'none', own: signedIn },
  { route: 'countUnreadNotices', object: 'none', own: signedIn },
  { route: 'readAllNotices', object: 'none', own: signedIn },
  {
    route: 'readNotice',
    object: 'notice',
    own: '401 200 404 404 404 404 404 404',
    foreign: nobodySignedIn,
    missing: nobodySignedIn,
  },

  { route: 'listReviews', object: 'none', own: staffOn('200') },
  { route: 'readReview', object: 'version', own: staffOn('200'), missing: staffOn('404') },
  {
    route: 'decideReview',
    object: 'version',
    send: { decision: 'approve' },
    own: staffOn('409'),
    missing: staffOn('404'),
  },
  { route: 'listReportedListings', object: 'none', own: staffOn('200') },
  // Read up to long ago: what was reported since is not decided.
  {
    route: 'dismissReports',
    object: 'public-listing',
    send: { seenUntil: '2020-01-01T00:00:00.000Z' },
    own: staffOn('409'),
    foreign: staffOn('409'),
    missing: staffOn('404'),
  },
  // Asked of the hidden listing alone, which nobody has reported.
  {
    route: 'takeDownListing',
    object: 'public-listing',
    send: { reason: 'unlawful' },
    foreign: staffOn('409'),
    missing: staffOn('404'),
  },

  { route: 'GET /healthz', ...open },
  { route: 'GET /readyz', ...open },
  { route: 'GET /sitemap.xml', ...open },
  { route: 'GET /api/v1/openapi.json', ...open },
  // The shell stands in for what is hidden or never was: nothing of the listing is in it.
  {
    route: 'GET /listings/:listingId',
    object: 'public-listing',
    own: everybody,
    foreign: everybody,
    missing: everybody,
  },
  // The file is for the two parties, once they have agreed on a time.
  {
    route: 'GET /api/v1/orders/:orderId/calendar.ics',
    object: 'agreed-order',
    own: '401 200 200 404 404 404 404 404',
    foreign: '401 404 404 200 404 404 404 404',
    missing: nobodySignedIn,
  },
  // The signed token in the address is the whole permission (RFC 8058); here it is a forged one.
  { route: 'GET /unsubscribe/:token', object: 'none', own: nobody },
  { route: 'POST /unsubscribe/:token', object: 'none', send: {}, own: nobody },
  { route: 'GET /photos/:file', object: 'none', own: nobody },
  // Signed by the processor, not by a session: without the signature nobody gets in.
  { route: 'POST /api/v1/stripe-events', object: 'none', send: {}, own: '400 400 400 400 400 400 400 400' },
  // better-auth's own router guards itself (auth tests); this asks for the session of the cookie.
  { route: 'ALL /api/auth/*splat', object: 'none', own: everybody },
]

import type TestAgent from 'supertest/lib/agent'

import { batchBody } from '@/seed/batch-body'
import { buildMember, type BuiltMember } from '@/seed/build-member'
import { buildSeller, type BuiltSeller } from '@/seed/build-seller'
import { loadPlaces } from '@/seed/load-places'
import { loadRules } from '@/seed/load-rules'
import type { FishBody } from '@/shared/contracts/fish-batch'
import type { OwnListing } from '@/shared/contracts/listings'
import { keyed, openTestServer, TEST_NOW, type TestServer } from '@/tests/support/server'
import { plainPhoto } from '@/tests/support/pictures'

type SellerWish = Omit<Parameters<typeof buildSeller>[1], 'member'>

export interface Hatchery {
  agent: TestAgent
  member: BuiltMember
  seller: BuiltSeller
  photoId: string
}

export interface ListingDesk extends TestServer {
  hatchery: (email: string, wish?: SellerWish) => Promise<Hatchery>
  moderator: (email: string) => Promise<TestAgent>
}

const own = '/api/v1/sellers/mine/listings'

export async function uploadPhoto(agent: TestAgent, width = 640): Promise<string> {
  const file = await plainPhoto({ width, height: 480 })
  const { body } = await agent.post('/api/v1/photos').attach('file', file, 'batch.jpg').expect(201)
  return body.photoId
}

/** A whole batch as this hatchery would type it on the day of the tests. */
export function draftOf({ photoId }: Hatchery, change: Partial<FishBody> = {}): FishBody {
  const photos = [{ photoId, takenOn: '2027-01-12', hasRuler: true }]
  return batchBody(new Date(TEST_NOW), { photos, ...change })
}

/** Begins a listing and keeps this draft; not submitted. */
export async function begin({ agent }: Hatchery, draft: object): Promise<OwnListing> {
  const begun = await agent.post(own).set(keyed()).send({}).expect(201)
  const { listingId, draftRevision } = begun.body
  await agent.patch(`${own}/${listingId}`).send({ draft, draftRevision }).expect(200)
  return (await agent.get(`${own}/${listingId}`).expect(200)).body
}

/** Sends in the draft as it stands; the caller looks at the answer. */
export function submit({ agent }: Hatchery, listing: Pick<OwnListing, 'listingId' | 'draftRevision'>) {
  const { listingId, draftRevision } = listing
  return agent.post(`${own}/${listingId}/submission`).set(keyed()).send({ draftRevision })
}

/** Keeps another draft of a listing and sends it in. */
export async function resubmit(hatchery: Hatchery, listingId: string, draft: object) {
  const { body } = await hatchery.agent.get(`${own}/${listingId}`).expect(200)
  const { draftRevision } = body
  const saved = await hatchery.agent.patch(`${own}/${listingId}`).send({ draft, draftRevision }).expect(200)
  return submit(hatchery, { listingId, draftRevision: saved.body.draftRevision })
}

/** Decides on the version of this listing that waits. */
export async function decide(
  moderator: TestAgent,
  listingId: string,
  decision: object = { decision: 'approve' },
) {
  const { body } = await moderator.get('/api/v1/moderation/listings').query({ limit: 50 }).expect(200)
  const row = body.items.find((one: { listingId: string }) => one.listingId === listingId)
  if (!row) throw new Error('nothing of this listing waits')
  return moderator.post(`/api/v1/moderation/listings/${row.versionId}/decision`).set(keyed()).send(decision)
}

/** A listing that went the whole way: drafted, sent in, approved. */
export async function liveListing(hatchery: Hatchery, moderator: TestAgent, change: Partial<FishBody> = {}) {
  const drafted = await begin(hatchery, draftOf(hatchery, change))
  await submit(hatchery, drafted).expect(200)
  await (
    await decide(moderator, drafted.listingId)
  ).ok
  return drafted.listingId
}

/** The server in the Ohio valley: places, demonstration rules, hatcheries that can be paid and moderators. */
export async function openListingDesk(label: string): Promise<ListingDesk> {
  const server = await openTestServer(label)
  await loadPlaces(server.db, { states: ['OH', 'KY', 'IN'] })
  await loadRules(server.db, { demonstration: true, at: new Date(TEST_NOW) })
  return {
    ...server,
    hatchery: async (email, wish) => {
      const member = await buildMember(server.db, { email })
      const seller = await buildSeller(server.db, { member, ...wish })
      const agent = await server.signedIn(email)
      return { agent, member, seller, photoId: await uploadPhoto(agent) }
    },
    moderator: async (email) => {
      await buildMember(server.db, { email, role: 'member,moderator' })
      return server.signedIn(email, { secondFactor: true })
    },
  }
}

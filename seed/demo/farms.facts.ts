import type { TaxonId } from '@/shared/domain/species/taxa.facts'

export interface FarmFacts {
  /** Also the mail name of its owner. */
  key: string
  owner: string
  farmName: string
  kind: 'hatchery' | 'grower'
  street: string
  city: string
  state: 'OH' | 'KY' | 'IN'
  zip: string
  phone: string
  about: string
  licence: 'have' | 'not-needed' | 'unsure'
  keeps: readonly TaxonId[]
  batches: number
  payouts: 'ready' | 'unfinished' | 'not-started'
}

type Row = readonly [
  who: readonly [key: string, owner: string, farmName: string, kind: 'h' | 'g'],
  where: readonly [street: string, city: string, state: FarmFacts['state'], zip: string, phone: string],
  about: string,
  licence: FarmFacts['licence'],
  batches: number,
  keeps: readonly TaxonId[],
]

// Real towns, invented farms. Phone numbers lie in the block that is kept free for stories (555-0100 to 555-0199).
// prettier-ignore
const rows: readonly Row[] = [
  [['hatchery', 'Walt Embry', 'Two Heron Hatchery', 'h'], ['2180 Heron Crossing', 'New Carlisle', 'OH', '45344', '(937) 555-0118'], 'Family hatchery with nine ponds and a heated barn. We grade on Thursdays, count by hand up to two hundred, and hand over at the barn door. Bring a lidded pail half full of your own water.', 'have', 9, ['bluegill', 'channel_catfish', 'yellow_perch', 'nile_tilapia', 'largemouth_bass', 'hybrid_bluegill', 'fathead_minnow']],
  [['greens', 'Odile Marsh', 'Riverbank Roots', 'g'], ['41 Levee Row', 'Covington', 'KY', '41011', '(859) 555-0131'], 'Two floating beds behind the house and more lettuce than we can eat, cut the morning you come. Worms from the big bin, and the pond gives a few fish beside.', 'not-needed', 2, ['goldfish', 'common_carp_koi']],
  [['brickyard', 'Tess Halloran', 'Brickyard Basement Fish', 'g'], ['916 Kiln Alley', 'Cincinnati', 'OH', '45223', '(513) 555-0142'], 'A dry basement, four round tanks and too many fry. Small orders welcome; I answer in the evening.', 'have', 4, ['nile_tilapia', 'blue_tilapia', 'red_hybrid_tilapia', 'goldfish']],
  [['lantern', 'Rufus Albright', 'Lantern Pond Fish Farm', 'h'], ['4407 Lantern Pond Road', 'Loveland', 'OH', '45140', '(513) 555-0167'], 'Spring-fed ponds since my grandfather dug the first one. Pond fish, nothing fancy, always counted twice.', 'have', 5, ['bluegill', 'hybrid_bluegill', 'largemouth_bass', 'golden_shiner', 'channel_catfish']],
  [['sycamore', 'Priya Raman', 'Sycamore Bend Aquatics', 'h'], ['77 Tannery Bend', 'Batavia', 'OH', '45103', '(513) 555-0175'], 'Indoor recirculating system, 24 tanks, water tested daily. Everything we sell hatched in this room.', 'have', 5, ['nile_tilapia', 'red_hybrid_tilapia', 'redclaw_crayfish', 'freshwater_prawn', 'yellow_perch']],
  [['gearworks', 'Milo Sandoval', 'Gearworks Fish Room', 'g'], ['1530 Gearworks Street', 'Dayton', 'OH', '45414', '(937) 555-0109'], 'Hobby that outgrew the garage. Tilapia all winter, koi in summer.', 'have', 4, ['blue_tilapia', 'nile_tilapia', 'common_carp_koi', 'fathead_minnow']],
  [['glenrill', 'Hanna Voss', 'Glenrill Trout', 'h'], ['3 Millrace Terrace', 'Yellow Springs', 'OH', '45387', '(937) 555-0154'], 'Cold spring water, 54 degrees all year. Trout only, and only what the spring can carry.', 'have', 4, ['rainbow_trout']],
  [['plumcreek', 'Dale Whitlock', 'Plum Creek Fingerlings', 'h'], ['612 Plum Creek Lane', 'Bellbrook', 'OH', '45305', '(937) 555-0181'], 'Perch, feed-trained and graded to a half inch. Ask how they eat: we will show you.', 'have', 4, ['yellow_perch', 'largemouth_bass', 'hybrid_striped_bass']],
  [['southgate', 'Amara Osei', 'Southgate Tanks', 'g'], ['288 Parsonage Street', 'Columbus', 'OH', '43207', '(614) 555-0126'], 'Aquaponics class of the neighbourhood garden. Spare fish go to people who build their own.', 'have', 3, ['nile_tilapia', 'goldfish', 'blue_tilapia']],
  [['darbyflat', 'Gus Lindqvist', 'Darby Flat Hatchery', 'h'], ['9021 Flatwater Pike', 'Galloway', 'OH', '43119', '(614) 555-0148'], 'Catfish, sunfish and forage for farm ponds. Weekday pickups from the loading dock.', 'have', 6, ['channel_catfish', 'bluegill', 'hybrid_bluegill', 'golden_shiner', 'fathead_minnow', 'hybrid_striped_bass']],
  [['olentree', 'Bea Tillman', 'Olentree Koi & Pond', 'h'], ['54 Orchard Spur', 'Delaware', 'OH', '43015', '(740) 555-0117'], 'Koi bred for colour and patience. Every fish is photographed beside a ruler before it leaves.', 'have', 4, ['common_carp_koi', 'goldfish']],
  [['tollgate', 'Ephraim Yates', 'Tollgate Crayfish', 'g'], ['1711 Old Tollgate', 'Oxford', 'OH', '45056', '(513) 555-0193'], 'Redclaw and prawns in a greenhouse, heated by compost. Yes, really.', 'have', 4, ['redclaw_crayfish', 'freshwater_prawn', 'nile_tilapia']],
  [['grantridge', 'Lou Pennick', 'Grant Ridge Ponds', 'h'], ['830 Persimmon Ridge', 'Alexandria', 'KY', '41001', '(859) 555-0122'], 'Hill ponds, clay bottom, good bluegill. We serve both sides of the river.', 'have', 5, ['bluegill', 'hybrid_bluegill', 'channel_catfish', 'golden_shiner']],
  [['banklick', 'Serena Dufour', 'Banklick Backyard Fish', 'g'], ['219 Cooper Hollow', 'Independence', 'KY', '41051', '(859) 555-0139'], 'Greenhouse beds and one very productive tank. I sell what I do not need.', 'not-needed', 3, ['nile_tilapia', 'goldfish', 'fathead_minnow']],
  [['limestone', 'Cormac Bligh', 'Limestone Spring Trout', 'h'], ['65 Springhouse Bend', 'Lexington', 'KY', '40511', '(859) 555-0156'], 'Hard water straight from the rock. Trout and perch; bring a cooler.', 'have', 4, ['rainbow_trout', 'yellow_perch']],
  [['jessamine', 'Ivy Prather', 'Jessamine Koi House', 'g'], ['1402 Dogwood Spur', 'Nicholasville', 'KY', '40340', '(859) 555-0170'], 'Pond people since 2009. Koi and comets for gardens and grow beds.', 'not-needed', 3, ['common_carp_koi', 'goldfish']],
  [['beargrass', 'Theo Marchetti', 'Beargrass City Fish', 'g'], ['517 Cooperage Court', 'Louisville', 'KY', '40214', '(502) 555-0114'], 'Warehouse farm under lights. Tilapia fry every three weeks, ask for the next date.', 'have', 5, ['nile_tilapia', 'freshwater_prawn', 'channel_catfish']],
  [['floydsfork', 'Ada Kessler', 'Floyd Fork Hatchery', 'h'], ['12050 Ferry Bottom Road', 'Louisville', 'KY', '40299', '(502) 555-0185'], 'Twelve ponds and a hatching house. Orders above five hundred: a day more, please.', 'have', 6, ['bluegill', 'channel_catfish', 'hybrid_striped_bass', 'yellow_perch', 'fathead_minnow', 'golden_shiner']],
  [['riverstep', 'Jonah Birdwell', 'Riverstep Fish', 'h'], ['208 Ferry Stair', 'Madison', 'IN', '47250', '(812) 555-0103'], 'Where the hills come down to the river. Pond stock from spring to late fall.', 'have', 4, ['bluegill', 'hybrid_bluegill', 'channel_catfish', 'largemouth_bass']],
  [['whitewater', 'Opal Greer', 'Whitewater Fry', 'g'], ['35 Depot Yard', 'Richmond', 'IN', '47374', '(765) 555-0128'], 'Small batches, honest counts. I hatch goldfish and minnows for indoor systems.', 'have', 3, ['goldfish', 'fathead_minnow', 'common_carp_koi']],
  [['tenpenny', 'Silas Rowntree', 'Tenpenny Perch', 'h'], ['1890 Tenpenny Road', 'Cambridge City', 'IN', '47327', '(765) 555-0161'], 'One fish, done well. Perch on pellets, three grades.', 'have', 3, ['yellow_perch', 'largemouth_bass']],
  [['quarryside', 'Mina Achterberg', 'Quarryside Aquaponics', 'g'], ['640 Stonecutter Row', 'Bloomington', 'IN', '47401', '(812) 555-0177'], 'Teaching farm on an old quarry. Students do the counting, so you get a few extra.', 'have', 4, ['channel_catfish', 'common_carp_koi', 'freshwater_prawn', 'goldfish']],
  [['stillmeadow', 'Pete Zoller', 'Stillmeadow Fish', 'h'], ['77 Hollow Barn Road', 'Ellettsville', 'IN', '47429', '(812) 555-0191'], 'New here. Bass and bluegill from our own broodstock.', 'unsure', 2, ['largemouth_bass', 'bluegill']],
  // Sellers whose set-up with the payment processor is not through yet: they have drafts and nothing on sale.
  [['shelbyglen', 'Cleo Farrow', 'Shelby Glen Fish', 'g'], ['980 Clover Bottom', 'Shelbyville', 'KY', '40065', '(502) 555-0136'], 'Setting up. First fry in a few weeks.', 'unsure', 1, ['nile_tilapia']],
  [['hilltop', 'Arlo Finch', 'Hilltop Pails', 'g'], ['18 Chapel Rise', 'Hanover', 'IN', '47243', '(812) 555-0144'], 'A few pails of fish each summer.', 'have', 1, ['goldfish']],
]

const notReady: Record<string, FarmFacts['payouts']> = { shelbyglen: 'unfinished', hilltop: 'not-started' }

export const farms: readonly FarmFacts[] = rows.map(([who, where, about, licence, batches, keeps]) => {
  const [key, owner, farmName, kind] = who
  const [street, city, state, zip, phone] = where
  return {
    ...{ key, owner, farmName, kind: kind === 'h' ? 'hatchery' : 'grower', street, city, state, zip, phone },
    ...{ about, licence, batches, keeps, payouts: notReady[key] ?? 'ready' },
  }
})

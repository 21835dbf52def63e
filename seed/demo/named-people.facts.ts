/** The invented people that `npm start` prints. They are for local work only: their words stand in this file. */
export interface NamedPerson {
  key: 'beginner' | 'hatchery' | 'greens' | 'moderator' | 'admin'
  /** As printed. */
  role: string
  name: string
  email: string
  zip: string
  note: string
  /** Staff only: the secret behind their second factor, as better-auth keeps it, in plain letters. */
  factorSecret?: string
}

/** Theirs and every other demo person's. */
export const DEMO_PASSWORD = 'two herons at the gate'

// prettier-ignore
export const namedPeople: readonly NamedPerson[] = [
  { key: 'beginner', role: 'beginner', name: 'Nora Quill', email: 'beginner@tankward.example', zip: '45220', note: 'in Cincinnati, OH; has bought once, and has fish to collect' },
  { key: 'hatchery', role: 'hatchery', name: 'Walt Embry', email: 'hatchery@tankward.example', zip: '45344', note: 'Two Heron Hatchery, near Dayton, OH; orders wait for an answer' },
  { key: 'greens', role: 'grower of greens', name: 'Odile Marsh', email: 'greens@tankward.example', zip: '41011', note: 'Riverbank Roots, Covington, KY; sells lettuce, basil and worms, and a few fish from her pond' },
  { key: 'moderator', role: 'moderator', name: 'Imre Castell', email: 'moderator@tankward.example', zip: '45202', note: 'a queue of listings waits', factorSecret: 'demo-moderator-second-factor-0001' },
  { key: 'admin', role: 'admin', name: 'June Okafor', email: 'admin@tankward.example', zip: '45202', note: 'may do what a moderator may', factorSecret: 'demo-admin-second-factor-key-0002' },
]

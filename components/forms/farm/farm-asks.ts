/** What each answer of the farm is asked for with while it is missing; rows are named without their number. */
export const farmAsks: Readonly<Record<string, string>> = {
  farmName: 'What is your farm called?',
  kind: 'Hatchery or grower?',
  street: 'Where do people collect? Street and number.',
  city: 'Which town?',
  state: 'Which state?',
  zip: 'The ZIP, five digits.',
  phone: 'A phone number, like (513) 555-0142.',
  'licences.answer': 'A licence, none needed, or not sure yet?',
}

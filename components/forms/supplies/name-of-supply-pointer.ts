export const supplyLists = ['tiers', 'windows', 'photos']

/** The form's name for a place the server points at: "#/tiers/1/unitCents". null: nothing a form could show it at. */
export function nameOfSupplyPointer(pointer: string): string | null {
  if (!pointer.startsWith('#/')) return null
  const steps = pointer.slice(2).split('/')
  const name = (steps[0] === 'draft' ? steps.slice(1) : steps).join('.')
  // What the form fills in by itself is told at the question it comes from.
  if (name.startsWith('farm')) return 'standing'
  if (name.startsWith('lotCode')) return 'harvest.bed'
  if (name === 'saleUnit') return 'saleUnit.kind'
  if (name === 'harvest') return 'harvest.day'
  if (name.startsWith('statesServed')) return 'statesServed'
  return supplyLists.includes(name) ? `${name}.root` : name
}

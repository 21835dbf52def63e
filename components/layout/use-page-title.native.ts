/** Phones show no tab. */
export function usePageTitle(title: string, isInView: boolean) {
  return isInView ? title : undefined
}

export interface PickedFile {
  name: string
  mime: string
  sizeBytes: number
  /** For a preview only. */
  uri: string
  body: Blob
}

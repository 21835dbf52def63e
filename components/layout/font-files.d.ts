// Metro turns an imported font file into the number of its asset.
declare module '*.ttf' {
  const asset: number
  export default asset
}

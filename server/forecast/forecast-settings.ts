interface ForecastSettings {
  /** Of the forecast service, without a path; null: there is none, and nothing is asked. */
  url: string | null
}

let settings: ForecastSettings = { url: null }

export function configureForecast(given: ForecastSettings): void {
  settings = { url: given.url?.replace(/\/+$/, '') ?? null }
}

export function forecastSettings(): ForecastSettings {
  return settings
}

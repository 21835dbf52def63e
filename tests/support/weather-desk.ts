import { startForecast } from '@/server/forecast/fake/start-fake'
import { configureForecast } from '@/server/forecast/forecast-settings'
import { forgetForecasts } from '@/server/forecast/read-forecast'
import { openShipDesk } from '@/tests/support/ship-desk'

/** The desk of boxes with the practice forecast beside it: mild until a test says otherwise. */
export async function openWeatherDesk(label: string) {
  const desk = await openShipDesk(label)
  const weather = await startForecast({})
  configureForecast({ url: weather.url })
  return {
    ...desk,
    weather,
    /** Days of frost at both ends, more than any packing stands. */
    frost: (from: string, until: string): void => {
      weather.setWeather({ from, until, minC: -14, maxC: -4 })
      forgetForecasts()
    },
    mild: (): void => {
      weather.clearWeather()
      forgetForecasts()
    },
    close: async () => {
      configureForecast({ url: null })
      await weather.stop()
      await desk.close()
    },
  }
}

export type WeatherDesk = Awaited<ReturnType<typeof openWeatherDesk>>

import { useState } from 'react'

import { optionWords } from './packing-words'
import { SeasonStrip } from './season-strip'
import { seasonWords, weekWords } from './season-words'

import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Card } from '@/components/ui/card'
import { DataTable } from '@/components/ui/data-table'
import { Heading } from '@/components/ui/heading'
import { Text } from '@/components/ui/text'
import type { ReplyOf } from '@/shared/api/endpoint'
import type { Endpoints } from '@/shared/api/routes.gen'
import type { SeasonOption } from '@/shared/domain/season/season-classes.facts'
import { seasonSources } from '@/shared/domain/season/season-classes.facts'
import { mondayOfWeek } from '@/shared/times/monday-of-week'
import { printSource } from '@/shared/sources'

type Season = ReplyOf<Endpoints['readSeason']>
type Week = Season['weeks'][number]

const words = (option: string | undefined) => (option ? (optionWords[option as SeasonOption] ?? '') : '')

/** How to pack for each kind of forecast; '' where nothing makes it safe. */
function packedFor({ forCold, forHeat }: Week): string {
  if (!forCold || !forHeat) return ''
  return forCold === forHeat
    ? `Pack with ${words(forCold)}.`
    : `When a cold day is forecast, pack with ${words(forCold)}; when a hot one, with ${words(forHeat)}.`
}

export function SeasonAnswer({ season }: { season: Season }) {
  const [isTable, setIsTable] = useState(false)
  const { year, week, weeks, nextSafeWeek } = season
  const now = weeks[week - 1]
  if (!now) return null
  const { word, tone } = seasonWords[now.verdict]
  const rows = weeks.map((one, at) => ({ ...one, number: at + 1 }))
  return (
    <Card>
      <Heading level={2} size="lead">
        The year
      </Heading>
      <Banner tone={tone} title={`This week: ${word}`} isLive>
        {packedFor(now) ||
          (nextSafeWeek === undefined
            ? 'No week of the year is safe with this packing.'
            : `The next safe week begins ${weekWords(nextSafeWeek < week ? year + 1 : year, nextSafeWeek)}.`)}
      </Banner>
      <SeasonStrip
        weeks={weeks.map(({ verdict }) => verdict)}
        mondays={rows.map(({ number }) => mondayOfWeek(year, number))}
        thisWeek={week}
      />
      <Button
        kind="quiet"
        icon={isTable ? 'up' : 'down'}
        label={isTable ? 'Hide the table' : 'Show all weeks as a table'}
        isExpanded={isTable}
        onPress={() => setIsTable(!isTable)}
      />
      {isTable ? (
        <DataTable
          label="All weeks of the year"
          rows={rows}
          rowKey={({ number }) => String(number)}
          columns={[
            {
              key: 'week',
              title: 'Week of',
              cell: ({ number }) => <Text>{weekWords(year, number)}</Text>,
              minWidthPx: 80,
            },
            {
              key: 'verdict',
              title: 'Verdict',
              cell: ({ verdict }) => <Text>{seasonWords[verdict].word}</Text>,
              minWidthPx: 120,
            },
            {
              key: 'packs',
              title: 'How to pack',
              cell: (row) => <Text size="note">{packedFor(row)}</Text>,
              minWidthPx: 220,
            },
          ]}
        />
      ) : null}
      <Text size="note" tint="muted">
        {`By usual weather: safe in nine of ten such trips, packed as the forecast of the day asks. Stricter than the check of a single trip, never milder. ${seasonSources.map(printSource).join('; ')}.`}
      </Text>
    </Card>
  )
}

import type { IconName } from './icon-paths'

import type { ColorName, Tone } from '@/constants/theme'

export const toneTint: Record<Tone, ColorName> = {
  neutral: 'muted',
  info: 'netting',
  safe: 'safe',
  caution: 'warm',
  danger: 'danger',
  cold: 'frost',
  hot: 'warm',
  today: 'onAlgae',
}

export const toneIcon: Record<Tone, IconName> = {
  neutral: 'info',
  info: 'info',
  safe: 'check',
  caution: 'warn',
  danger: 'stop',
  cold: 'cold',
  hot: 'hot',
  today: 'calendar',
}

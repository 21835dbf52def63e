import { iconPaths, type IconName } from './icon-paths'

import { color, type ColorName } from '@/constants/theme'

interface Props {
  name: IconName
  sizePx?: number
  tint?: ColorName
  isFilled?: boolean
}

/** Always decoration: the word stands beside it or on the control around it. */
export function Icon({ name, sizePx = 24, tint = 'ink', isFilled = false }: Props) {
  const pen = color[tint]
  return (
    <svg
      width={sizePx}
      height={sizePx}
      viewBox="0 0 24 24"
      aria-hidden
      focusable={false}
      style={{ flexShrink: 0 }}
      data-icon={name}
    >
      {iconPaths[name].map((path) => (
        <path
          key={path}
          d={path.replace('*', '')}
          fill={isFilled || path.startsWith('*') ? pen : 'none'}
          stroke={pen}
          strokeWidth={2}
          strokeLinecap="round"
          strokeLinejoin="round"
        />
      ))}
    </svg>
  )
}

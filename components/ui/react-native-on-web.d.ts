import type { WebKeyEvent } from './web-key-event'

// What react-native-web understands beyond React Native's own types.
declare module 'react-native' {
  interface AccessibilityProps {
    'aria-activedescendant'?: string
    'aria-autocomplete'?: 'list' | 'none' | 'both'
    'aria-controls'?: string
    'aria-current'?: 'page' | 'step' | 'location' | 'date' | 'true' | undefined
    'aria-describedby'?: string | undefined
    'aria-haspopup'?: 'listbox' | 'menu' | 'dialog'
    'aria-invalid'?: boolean
    'aria-level'?: number
    'aria-pressed'?: boolean
    'aria-required'?: boolean
    'aria-roledescription'?: string
    'aria-sort'?: 'ascending' | 'descending' | 'none' | undefined
  }
  interface ViewProps {
    dataSet?: Record<string, string | undefined>
    tabIndex?: 0 | -1
    inert?: boolean
    onKeyDown?: (event: WebKeyEvent) => void
  }
  interface TextProps {
    dataSet?: Record<string, string | undefined>
    href?: string
    hrefAttrs?: { target?: string; rel?: string; download?: boolean | string }
    tabIndex?: 0 | -1
  }
  interface PressableProps {
    dataSet?: Record<string, string | undefined>
  }
  interface PressableStateCallbackType {
    hovered?: boolean
    focused?: boolean
  }
  interface ViewStyle {
    clipPath?: string
    maskImage?: string
    maskComposite?: string
    backgroundImage?: string
    backgroundSize?: string
  }
}

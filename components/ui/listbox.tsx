import type { ReactNode } from 'react'
import { StyleSheet } from 'react-native'

import { webElement } from './web-element'

import { color, radius, touchPx } from '@/constants/theme'

interface ListboxProps {
  nativeID: string
  label: string
  children: ReactNode
}

export function Listbox({ nativeID, label, children }: ListboxProps) {
  return webElement('div', {
    role: 'listbox',
    id: nativeID,
    'aria-label': label,
    style: styles.list,
    children,
  })
}

interface OptionProps {
  nativeID: string
  isActive: boolean
  onChoose: () => void
  children: ReactNode
}

export function Option({ nativeID, isActive, onChoose, children }: OptionProps) {
  return webElement('div', {
    role: 'option',
    id: nativeID,
    'aria-selected': isActive,
    // Keeps the keyboard in the text field while the pointer chooses.
    onMouseDown: (event: { preventDefault: () => void }) => event.preventDefault(),
    onClick: onChoose,
    ref: isActive ? showInList : undefined,
    style: [styles.option, isActive ? styles.active : null],
    children,
  })
}

function showInList(element: HTMLElement | null) {
  element?.scrollIntoView({ block: 'nearest' })
}

const styles = StyleSheet.create({
  list: {
    maxHeight: 300,
    overflow: 'scroll',
    backgroundColor: color.card,
    borderWidth: 1,
    borderStyle: 'solid',
    borderColor: color.edge,
    borderRadius: radius.tag,
  },
  option: {
    display: 'flex',
    flexDirection: 'column',
    justifyContent: 'center',
    minHeight: touchPx,
    paddingHorizontal: 12,
    paddingVertical: 6,
    cursor: 'pointer',
    borderWidth: 0,
    borderLeftWidth: 4,
    borderStyle: 'solid',
    borderColor: 'transparent',
  },
  active: { backgroundColor: color.sunk, borderColor: color.netting },
})

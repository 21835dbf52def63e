import { createContext, use, useEffect, useRef, useState, type ReactNode } from 'react'
import { StyleSheet, View } from 'react-native'

import { Button } from './button'
import { Icon } from './icon'
import { IconButton } from './icon-button'
import { Text } from './text'
import { toneIcon, toneTint } from './tone'

import { color, radius, space } from '@/constants/theme'

export interface Toast {
  text: string
  tone?: 'safe' | 'info' | 'danger'
  action?: { label: string; onPress: () => void }
}

type ShowToast = (toast: Toast) => void

const shownMs = 6000
const ToastContext = createContext<ShowToast>(() => undefined)

export function useToast(): ShowToast {
  return use(ToastContext)
}

export function ToastProvider({ children }: { children: ReactNode }) {
  const [shown, setShown] = useState<(Toast & { id: number })[]>([])
  const lastId = useRef(0)
  function show(toast: Toast) {
    lastId.current += 1
    const id = lastId.current
    setShown((before) => [...before.slice(-2), { ...toast, id }])
  }
  const close = (id: number) => setShown((before) => before.filter((toast) => toast.id !== id))
  return (
    <ToastContext value={show}>
      {children}
      <View aria-live="polite" role="status" dataSet={{ screenOnly: '' }} style={styles.stack}>
        {shown.map((toast) => (
          <ToastLine key={toast.id} toast={toast} onClose={() => close(toast.id)} />
        ))}
      </View>
    </ToastContext>
  )
}

// A refusal or an offered act stays until it is closed: nobody has to read against the clock.
function ToastLine({ toast, onClose }: { toast: Toast; onClose: () => void }) {
  const { text, tone = 'info', action } = toast
  const stays = tone === 'danger' || action !== undefined
  const close = useRef(onClose)
  useEffect(() => {
    close.current = onClose
  })
  useEffect(() => {
    if (stays) return
    const timer = setTimeout(() => close.current(), shownMs)
    return () => clearTimeout(timer)
  }, [stays])
  return (
    <View style={styles.toast} dataSet={{ enter: 'up' }}>
      <Icon name={toneIcon[tone]} tint={toneTint[tone]} />
      <Text size="note" style={styles.words}>
        {text}
      </Text>
      {action ? (
        <Button
          kind="quiet"
          label={action.label}
          onPress={() => {
            action.onPress()
            onClose()
          }}
        />
      ) : null}
      <IconButton icon="close" label="Close this notice" onPress={onClose} />
    </View>
  )
}

const styles = StyleSheet.create({
  stack: {
    position: 'absolute',
    left: 0,
    right: 0,
    bottom: 72,
    padding: space.lg,
    gap: space.sm,
    alignItems: 'center',
    pointerEvents: 'box-none',
  },
  toast: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.md,
    paddingLeft: space.lg,
    width: '100%',
    maxWidth: 520,
    borderRadius: radius.tag,
    borderWidth: 2,
    borderColor: color.ink,
    backgroundColor: color.card,
  },
  words: { flex: 1, paddingVertical: space.md },
})

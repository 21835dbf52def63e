export type DeskKeys = Record<string, (() => void) | undefined>

// Phones have no desk keys: every act has its button.
export function useDeskKeys(_keys: DeskKeys, _isOn: boolean) {}

export function useSendKey(_send: () => void) {}

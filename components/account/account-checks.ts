export const leastPassword = 12

/** A sentence about an address that cannot be one, else undefined. The mail itself is the real check. */
export function emailFault(email: string): string | undefined {
  if (email.trim() === '') return 'Please give your e-mail address.'
  return /^[^\s@]+@[^\s@]+\.[^\s@]+$/.test(email.trim())
    ? undefined
    : 'An e-mail address looks like name@example.com.'
}

/** A sentence about a password that is too short, else undefined. The server looks at the rest. */
export function newPasswordFault(password: string): string | undefined {
  if (password === '') return 'Please choose a password.'
  return password.length < leastPassword ? `At least ${leastPassword} characters, please.` : undefined
}

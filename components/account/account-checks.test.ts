import { describe, expect, it } from 'vitest'

import { emailFault, newPasswordFault } from './account-checks'

describe('what is checked before an account form is sent', () => {
  it('lets ordinary and long addresses through, with blanks around them', () => {
    expect(emailFault(' ada.fisher+tank@mail.example.org ')).toBeUndefined()
  })

  it('says what an address looks like when it is none', () => {
    expect(emailFault('ada.fisher')).toMatch(/looks like/)
    expect(emailFault('a b@c.de')).toMatch(/looks like/)
    expect(emailFault('  ')).toMatch(/Please give/)
  })

  it('asks for twelve characters, of any kind', () => {
    expect(newPasswordFault('elevenchars')).toMatch(/At least 12/)
    expect(newPasswordFault('twelve chars')).toBeUndefined()
  })
})

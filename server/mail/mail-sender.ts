let from = { name: 'Tankward', address: 'hello@tankward.example' }

export function setMailSender(address: string): void {
  from = { name: 'Tankward', address }
}

/** Whose name stands on mails and calendar files. */
export const mailSender = (): { name: string; address: string } => from

export const mail = {
  greeting: (name: string) => `Hello ${name},`,
  closing:
    'Tarekeep keeps this book for your company and the plant together. Nobody needs to answer this message.',
  reset: {
    subject: 'Choose a new password',
    text: 'Someone asked for a new password for your sign-in. If it was you, choose it here within an hour:',
    otherwise: 'If it was not you, leave this message alone: nothing changes.',
  },
  invitation: {
    subject: (company: string) => `Your sign-in for ${company}`,
    text: (by: string, company: string) =>
      `${by} has made a sign-in for you at ${company}. Choose your password here within 14 days:`,
  },
};

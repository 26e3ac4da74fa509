import { z } from 'zod'

export const SignInBody = z.strictObject({
  email: z.string({ error: 'Enter your e-mail address.' }).trim().min(3, 'Enter your e-mail address.').max(254, 'That is too long for an e-mail address.'),
  password: z.string({ error: 'Enter your password.' }).min(1, 'Enter your password.').max(512, 'That is too long for a password.'),
})

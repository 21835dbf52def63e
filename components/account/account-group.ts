// The lazily loaded group of signing in and of Me: one chunk, imported only through lazy().
export { AskResetForm } from './ask-reset-form'
export { EmailLanding } from './email-landing'
export { ResetForm } from './reset-form'
export { SecondFactorForm } from './second-factor-form'
export { SignInForm } from './sign-in-form'
export { SignUpForm } from './sign-up-form'
export { MemberHome } from '@/components/members/member-home'
export { SecondFactorSettings } from '@/components/members/second-factor-settings'

export { ForgottenPage as Component } from '@/features/session/components/forgotten-page';

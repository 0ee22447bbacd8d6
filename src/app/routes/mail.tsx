export { MailPage as Component } from '@/features/mail/components/mail-page';

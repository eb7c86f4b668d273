export { MeScreen as default } from '@/components/me/me-screen';

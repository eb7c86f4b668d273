export { SetupScreen as default } from '@/components/plan/setup-screen';

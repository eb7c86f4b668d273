export { SafetyScreen as default } from '@/components/safety/safety-screen';

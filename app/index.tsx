export { ReadyScreen as default } from '@/components/ready/ready-screen';

export { FirstAidScreen as default } from '@/components/first-aid/first-aid-screen';

export { StationScreen as default } from '@/components/station/station-screen';

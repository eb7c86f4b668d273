export { PlanScreen as default } from '@/components/plan/plan-screen';

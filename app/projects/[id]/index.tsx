export { ProjectScreen as default } from '@/components/projects/project-screen';

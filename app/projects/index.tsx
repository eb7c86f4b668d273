export { ProjectsScreen as default } from '@/components/projects/projects-screen';

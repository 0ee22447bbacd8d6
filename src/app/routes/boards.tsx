export { BoardsPage as Component } from '@/features/boards/components/boards-page';

export { BoardScreen as default } from '@/features/board/board-screen';

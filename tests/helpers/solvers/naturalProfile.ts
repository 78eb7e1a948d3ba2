export * from '@/server/solvers/exact/naturalProfile';

export * from '@/server/solvers/exact/polygonHydraulics';

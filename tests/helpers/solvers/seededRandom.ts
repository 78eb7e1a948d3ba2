export * from '@/server/verificationCases/reaches/seededRandom';

export * from '@/server/verificationCases/reaches/naturalReach';

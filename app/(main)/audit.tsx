export { AuditScreen as default } from '@/components/screens/audit/AuditScreen';

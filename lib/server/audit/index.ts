export { appendAudit, type AuditEntry } from './append';
export { verifyAudit, type Break } from './verify';

// Mail through one door: acts queue, `deliverMail` sends once they are committed, the outbox page reads.
export { deliverMail, deliverSoon, smtpTransport, type Transport } from './mail/deliver';
export { type OutboxMessage, outboxMessages, outboxOpen } from './mail/outbox';
export { type Mail, queueMail } from './mail/queue';

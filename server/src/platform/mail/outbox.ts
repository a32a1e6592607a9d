import { Inject, Injectable, Logger, type OnModuleDestroy } from '@nestjs/common';
import { Interval } from '@nestjs/schedule';
import nodemailer, { type Transporter } from 'nodemailer';
import { DataSource, type EntityManager, IsNull, LessThanOrEqual } from 'typeorm';
import { Clock } from '../clock/clock.js';
import { type Configuration, CONFIGURATION } from '../config/configuration.js';
import { OutboxMail } from './outbox-mail.entity.js';

const everyMs = 2000;
const atOnce = 20;
const longestWaitMs = 3_600_000;

/**
 * Mail by an outbox table: what is promised in a transaction is sent after it, again and again until it is taken.
 * No clinical content in a letter: a case number and a link.
 */
@Injectable()
export class Outbox implements OnModuleDestroy {
  private readonly logger = new Logger(Outbox.name);
  private readonly transport: Transporter;
  private sending: Promise<void> | null = null;
  private closing = false;

  constructor(
    private readonly source: DataSource,
    private readonly clock: Clock,
    @Inject(CONFIGURATION) private readonly configuration: Configuration,
  ) {
    this.transport = nodemailer.createTransport(configuration.SMTP_URL);
  }

  /** The run under way is finished while there is a database, and none is begun any more. */
  async onModuleDestroy(): Promise<void> {
    this.closing = true;
    await this.sending;
    this.transport.close();
  }

  async put(em: EntityManager, mail: { to: string; subject: string; body: string }): Promise<void> {
    const now = this.clock.now();
    await em.insert(OutboxMail, {
      recipient: mail.to,
      subject: mail.subject,
      body: mail.body,
      createdAt: now,
      nextAttemptAt: now,
      sentAt: null,
    });
  }

  /** Sends what is due. Runs by itself; tests call it to wait for the letters. */
  @Interval(everyMs)
  async flush(): Promise<void> {
    // A run under way may have looked before the newest letter was there.
    await this.sending;
    if (this.closing) return;
    this.sending ??= this.sendDue().finally(() => (this.sending = null));
    await this.sending;
  }

  /** All that is due, some at a time. What was not taken is due later, so this ends. */
  private async sendDue(): Promise<void> {
    for (;;) {
      const due = await this.source.manager.find(OutboxMail, {
        where: { sentAt: IsNull(), nextAttemptAt: LessThanOrEqual(this.clock.now()) },
        order: { id: 'ASC' },
        take: atOnce,
      });
      for (const mail of due) {
        // What is left is due again after the next start.
        if (this.closing) return;
        await this.send(mail);
      }
      if (due.length < atOnce) return;
    }
  }

  private async send(mail: OutboxMail): Promise<void> {
    const attempts = mail.attempts + 1;
    try {
      await this.transport.sendMail({
        from: this.configuration.MAIL_FROM,
        to: mail.recipient,
        subject: mail.subject,
        text: mail.body,
      });
      // The text holds single-use links, so it does not stay behind.
      await this.source.manager.update(
        OutboxMail,
        { id: mail.id },
        { sentAt: this.clock.now(), attempts, body: '' },
      );
    } catch (error) {
      const waitMs = Math.min(longestWaitMs, 5000 * 2 ** attempts);
      const nextAttemptAt = new Date(this.clock.now().getTime() + waitMs);
      await this.source.manager.update(OutboxMail, { id: mail.id }, { attempts, nextAttemptAt });
      this.logger.warn(
        `mail ${mail.id} not taken: ${error instanceof Error ? error.message : String(error)}`,
      );
    }
  }
}

import { HEARTBEAT_S } from '#shared/contracts/draft-changes.js';
import type { Request, Response } from 'express';
import type { z } from 'zod';
import type { Actor } from './actor.js';
import { AppError } from './app-error.js';

/** What a stream tells again and again, and how often that may be. */
export interface Watched<T> {
  schema: z.ZodType<T>;
  look: (actor: Actor) => Promise<T>;
  /** Ends by itself after so long, seconds; 0 for a single look. */
  seconds: number;
}

/** An answer that goes on. */
export class StreamReply {
  constructor(
    readonly actor: Actor,
    readonly watched: Watched<unknown>,
    /** Lets in once more, as at the beginning; fails where the session, the membership or the role has gone. */
    readonly admitAgain: () => Promise<Actor>,
  ) {}
}

/** Of one person; a browser shows few pages at a time, and only those that are looked at listen. */
const PER_PERSON = 8;
const PER_PROCESS = 500;
/** Browsers come back after so long. */
const RETRY_MS = 3000;

/**
 * Streams that are open (server-sent events). Each looks when something of its village was written, and at every heartbeat;
 * before each look the person is let in anew.
 */
export class EventStreams {
  private readonly open = new Set<EventStream>();
  private closed = false;

  /** @throws {AppError} where somebody holds as many as they may, or the server stops */
  begin(request: Request, response: Response, reply: StreamReply): void {
    const { person } = reply.actor;
    const own = [...this.open].filter(({ personId }) => personId === person.id);
    if (this.closed || own.length >= PER_PERSON || this.open.size >= PER_PROCESS) {
      throw new AppError('too-many-attempts');
    }
    const stream = new EventStream(request, response, reply, () => this.open.delete(stream));
    this.open.add(stream);
    stream.start();
  }

  /** Something of the village was written. */
  wake(communityId: string): void {
    for (const stream of this.open) if (stream.communityId === communityId) stream.wake();
  }

  /** Ends them all, so that a server can stop; no other begins. */
  close(): void {
    this.closed = true;
    for (const stream of this.open) stream.end();
  }

  /** Waits for what is being looked at. */
  async settled(): Promise<void> {
    await Promise.allSettled([...this.open].map((stream) => stream.looking));
  }
}

class EventStream {
  readonly personId: string;
  readonly communityId: string;
  looking: Promise<void> = Promise.resolve();
  private last = '';
  private isWanted = false;
  private isLooking = false;
  private isOver = false;
  private readonly timers: NodeJS.Timeout[] = [];

  constructor(
    request: Request,
    private readonly response: Response,
    private readonly reply: StreamReply,
    private readonly onEnd: () => void,
  ) {
    this.personId = reply.actor.person.id;
    this.communityId = reply.actor.communityId;
    request.once('close', () => {
      this.end();
    });
    response.once('close', () => {
      this.end();
    });
  }

  start(): void {
    // `no-transform` keeps the compression from holding anything back, the last line does it with proxies.
    this.response.writeHead(200, {
      'Content-Type': 'text/event-stream; charset=utf-8',
      'Cache-Control': 'no-store, no-transform',
      'X-Accel-Buffering': 'no',
      // It is never used again, so a stopping server has nothing to wait for.
      Connection: 'close',
    });
    this.response.write(`retry: ${RETRY_MS}\n\n`);
    const { seconds } = this.reply.watched;
    this.wake();
    if (seconds === 0) {
      void this.looking.then(() => {
        this.end();
      });
      return;
    }
    const beat = setInterval(() => {
      this.response.write(':\n\n');
      this.wake();
    }, HEARTBEAT_S * 1000).unref();
    const over = setTimeout(() => {
      this.end();
    }, seconds * 1000).unref();
    this.timers.push(beat, over);
  }

  /** However many writes come at once, one look follows the one that is on its way. */
  wake(): void {
    this.isWanted = true;
    if (!this.isLooking) this.looking = this.lookOn();
  }

  end(): void {
    if (this.isOver) return;
    this.isOver = true;
    for (const timer of this.timers) clearTimeout(timer);
    this.response.end();
    this.onEnd();
  }

  private async lookOn(): Promise<void> {
    this.isLooking = true;
    try {
      while (this.isWanted && !this.isOver) {
        this.isWanted = false;
        await this.look();
      }
    } catch {
      // Not let in any more, or the records cannot be reached: whoever listens comes back and is told at the door.
      this.end();
    } finally {
      this.isLooking = false;
    }
  }

  private async look(): Promise<void> {
    const { watched, admitAgain } = this.reply;
    const text = JSON.stringify(watched.schema.parse(await watched.look(await admitAgain())));
    if (this.isOver || text === this.last) return;
    this.last = text;
    this.response.write(`event: glance\ndata: ${text}\n\n`);
  }
}

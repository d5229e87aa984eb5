import type { Endpoint } from '#shared/contracts/endpoint.js';
import type { Request, Response, Router } from 'express';
import type { DataSource } from 'typeorm';
import type { z } from 'zod';
import { askingOnce } from '../db/asked-once.js';
import { withHandOf, withWriteKey, type Actor, type Person } from './actor.js';
import { looksOnly } from '../policy/viewer.js';
import { AppError, notFound } from './app-error.js';
import { fieldErrors } from './field-errors.js';
import { actorFor, type HelpingRules } from './on-behalf.js';
import { EventStreams, StreamReply, type Watched } from './event-streams.js';
import {
  FileReply,
  sendFile,
  sendStoredFile,
  sendStreamedFile,
  StoredFileReply,
  StreamedFileReply,
} from './file-reply.js';
import { PreparedReply } from './reply.js';
import { sameSession } from './same-session.js';
import { withUpload, type UploadedFile } from './upload.js';
import { sha256OfFile } from '../storage/file-hash.js';
import { writeKeyOf } from './write-key.js';

type Parsed<S> = S extends z.ZodType ? z.output<S> : undefined;
type Answer<E extends Endpoint> = E['fileType'] extends string
  ? FileReply
  : E['response'] extends z.ZodType
    ? z.input<E['response']> | PreparedReply
    : FileReply | StoredFileReply | StreamedFileReply | StreamReply | undefined;

export interface Call<E extends Endpoint> {
  params: Parsed<E['params']>;
  query: Parsed<E['query']>;
  body: Parsed<E['body']>;
  request: Request;
}

type UploadHandler<E extends Endpoint> = (
  call: Call<E>,
  actor: Actor,
  file: UploadedFile,
) => Promise<Answer<E>>;
type Handler<E extends Endpoint, Who> = (call: Call<E>, who: Who) => Promise<Answer<E>> | Answer<E>;

/** Binds endpoints of the contracts to a router: gate first, then input, then the answer in its schema. */
export class Mount {
  /** Ids of all that was mounted; a test holds them against the contracts. */
  readonly ids: string[] = [];
  /** Answers that go on. */
  readonly streams = new EventStreams();
  private readonly underway = new Set<Promise<unknown>>();

  constructor(
    private readonly router: Router,
    private readonly dataSource: DataSource,
    /** Where files wait that come with a call, until it is answered. */
    private readonly waitingFolder: string,
    private readonly helping: HelpingRules,
  ) {}

  forAnybody<E extends Endpoint>(endpoint: E, handler: Handler<E, Person | null>): void {
    this.expect(endpoint, 'public');
    this.add(endpoint, async (request, call) => handler(call(), personOf(request)));
  }

  forPerson<E extends Endpoint>(endpoint: E, handler: Handler<E, Person>): void {
    this.expect(endpoint, 'signed-in');
    this.add(endpoint, async (request, call) => {
      const person = signedIn(endpoint, request);
      const helped = await this.helping.helpedIn(request, person);
      // What is a person's own is done by themself alone: nobody does it while they write for somebody else.
      if (helped !== null && endpoint.method !== 'GET') {
        throw new AppError('not-allowed', { reason: 'not-while-helping' });
      }
      if (helped?.shownPin === true && endpoint.readAsHelped) {
        return handler(call(), { ...helped.person, byCardIn: helped.communityId });
      }
      return handler(call(), person);
    });
  }

  forMember<E extends Endpoint>(endpoint: E, handler: Handler<E, Actor>): void {
    if (endpoint.access.kind !== 'member') throw new TypeError(`${endpoint.id} is not for members`);
    this.add(endpoint, async (request, call) => {
      const actor = await this.actor(endpoint, request);
      if (endpoint.method === 'GET') looksOnly(actor);
      const key = writeKeyOf(endpoint, request, actor, request.body);
      return withHandOf(actor, () => withWriteKey(key, () => handler(call(), actor)));
    });
  }

  /** For a call that brings a file. Whoever may not send is refused before anything of the file is read. */
  forMemberUpload<E extends Endpoint>(endpoint: E, handler: UploadHandler<E>): void {
    const { access, upload } = endpoint;
    if (access.kind !== 'member' || upload === null) throw new TypeError(`${endpoint.id} takes no file`);
    this.add(endpoint, async (request, _call, response) => {
      const actor = await this.actor(endpoint, request);
      return withUpload({ request, response, folder: this.waitingFolder, upload }, async ({ meta, file }) => {
        const asked = endpoint.countsOnce ? [meta, await sha256OfFile(file.path)] : null;
        const key = writeKeyOf(endpoint, request, actor, asked);
        return withHandOf(actor, () =>
          withWriteKey(key, () => handler(parseInput(endpoint, request, meta), actor, file)),
        );
      });
    });
  }

  /** For a call whose answer goes on: at every look the person is let in anew, in the very session that began it. */
  forMemberStream<E extends Endpoint>(endpoint: E, watch: (call: Call<E>) => Watched<unknown>): void {
    if (endpoint.access.kind !== 'member') throw new TypeError(`${endpoint.id} is not for members`);
    this.add(endpoint, async (request, call) => {
      const actor = await this.actor(endpoint, request);
      const isSame = sameSession(request);
      return new StreamReply(actor, watch(call()), async () => {
        if (!(await isSame())) throw new AppError('not-signed-in');
        return this.actor(endpoint, request);
      }) as Answer<E>;
    });
  }

  /** Waits for the calls that have begun, also where whoever called has hung up. */
  async settled(): Promise<void> {
    await Promise.allSettled([...this.underway, this.streams.settled()]);
  }

  private actor(endpoint: Endpoint, request: Request): Promise<Actor> {
    const person = signedIn(endpoint, request);
    return actorFor(this.dataSource, this.helping, endpoint, request, person, idsOf(endpoint, request));
  }

  private expect(endpoint: Endpoint, kind: Endpoint['access']['kind']): void {
    if (endpoint.access.kind !== kind) throw new TypeError(`${endpoint.id} is not ${kind}`);
  }

  private add<E extends Endpoint>(
    endpoint: E,
    handle: (request: Request, call: () => Call<E>, response: Response) => Promise<Answer<E>>,
  ): void {
    this.ids.push(endpoint.id);
    const method = endpoint.method.toLowerCase() as 'get' | 'post' | 'put' | 'patch' | 'delete';
    this.router[method](endpoint.path, async (request: Request, response: Response) => {
      const begin = () => handle(request, () => parseCall(endpoint, request), response);
      const handling = method === 'get' ? askingOnce(begin) : begin();
      this.underway.add(handling);
      const answer = await handling.finally(() => this.underway.delete(handling));
      if (answer instanceof StoredFileReply) await sendStoredFile(request, response, answer.file);
      else if (answer instanceof StreamedFileReply) {
        await sendStreamedFile(request, response, endpoint, answer.file);
      } else if (answer instanceof StreamReply) this.streams.begin(request, response, answer);
      else reply(endpoint, response, answer);
    });
  }
}

function personOf(request: Request): Person | null {
  return request.user ?? null;
}

function signedIn({ needsPassword }: Endpoint, request: Request): Person {
  const person = personOf(request);
  if (person === null) throw new AppError('not-signed-in');
  if (needsPassword && person.byCardIn !== undefined) {
    throw new AppError('not-allowed', { reason: 'needs-password' });
  }
  return person;
}

/** Ids of the path for the gate. One that is no id at all names nothing, so it is not found. */
function idsOf(endpoint: Endpoint, request: Request): Record<string, string> {
  const ids = Object.entries(request.params).map(([name, value]) => [name, String(value)] as const);
  const parsed = endpoint.params?.safeParse(Object.fromEntries(ids));
  if (parsed?.success === false && parsed.error.issues.some((issue) => /Id$/u.test(String(issue.path[0])))) {
    throw notFound();
  }
  return Object.fromEntries(ids);
}

function parseCall<E extends Endpoint>(endpoint: E, request: Request): Call<E> {
  if (endpoint.body !== undefined && request.headers['content-type'] !== undefined && !request.is('json')) {
    throw new AppError('wrong-content-type');
  }
  return parseInput(endpoint, request, request.body ?? {});
}

function parseInput<E extends Endpoint>(endpoint: E, request: Request, body: unknown): Call<E> {
  const parts = {
    params: endpoint.params?.safeParse({ ...request.params }),
    query: endpoint.query?.safeParse({ ...request.query }),
    body: endpoint.body?.safeParse(body, { reportInput: true }),
  };
  const issues = Object.values(parts).flatMap((part) => part?.error?.issues ?? []);
  if (issues.length > 0) throw new AppError('invalid-input', { errors: fieldErrors(issues) });
  return {
    params: parts.params?.data as Parsed<E['params']>,
    query: parts.query?.data as Parsed<E['query']>,
    body: parts.body?.data as Parsed<E['body']>,
    request,
  };
}

/** An answer that does not fit its own schema is a fault of ours and must not leave the house. */
function reply(endpoint: Endpoint, response: Response, answer: unknown): void {
  if (answer instanceof FileReply) {
    sendFile(response, endpoint, answer);
    return;
  }
  response.status(endpoint.status).setHeader('Cache-Control', 'no-store');
  if (answer instanceof PreparedReply) {
    if (answer.endpointId !== endpoint.id) throw new TypeError(`${endpoint.id} was given another's answer`);
    response.type('json').send(answer.json);
    return;
  }
  if (endpoint.response === undefined) response.end();
  else response.json(endpoint.response.parse(answer));
}

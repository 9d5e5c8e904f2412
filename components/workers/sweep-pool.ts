import type { ParsedCase } from '../../physics/case/index.js';
import { type AnswerTo, type RoomTask, thicknessOf } from '../../physics/sweep/room-task.js';
import type { FromSweepWorker, SweepWorker } from './sweep-messages.js';
import { WorkerLost } from './worker-lost.js';

/** How a run of tasks is to be done. */
export interface RunOptions<T extends RoomTask> {
  /** Told of every answer as it comes, in any order. */
  readonly onAnswer?: (index: number, answer: AnswerTo<T>) => void;
  readonly signal?: AbortSignal;
  /** Ahead of runs that are not urgent, for a single question someone waits for. */
  readonly urgent?: boolean;
}

/** Workers that share tasks about a case. */
export interface SweepPool {
  /**
   * Does tasks about a case, several runs at a time. Rejects with the signal's reason at once when
   * it is aborted, with an Error when a task fails, with `WorkerLost` when workers keep dying.
   */
  readonly run: <T extends RoomTask>(
    parsed: ParsedCase,
    tasks: readonly T[],
    options?: RunOptions<T>,
  ) => Promise<AnswerTo<T>[]>;
  /** True while a worker is busy, also with a task nobody waits for any more. */
  readonly isBusy: () => boolean;
  /** Ends every worker; runs under way reject. */
  readonly end: () => void;
}

/** A run gives up when workers die more often than this. */
const mostLosses = 3;

interface Run {
  readonly parsed: ParsedCase;
  readonly tasks: readonly RoomTask[];
  readonly waiting: number[];
  readonly urgent: boolean;
  readonly answered: (index: number, answer: AnswerTo<RoomTask>) => void;
  readonly reject: (error: unknown) => void;
  losses: number;
}

interface Member {
  readonly worker: SweepWorker;
  holds: ParsedCase | null;
  work: { readonly run: Run; readonly index: number } | null;
}

/**
 * A pool of at most `size` workers, hired as there is work. Tasks of one patient thickness go to the
 * worker that had that thickness before, since it remembers the scatter there; an idle worker takes
 * what is left.
 */
export function sweepPool(make: () => SweepWorker, size: number): SweepPool {
  const members = new Set<Member>();
  const knows = new Map<number, Member>();
  const runs = new Set<Run>();
  let tasks = 0;

  const hire = (): Member => {
    const member: Member = { worker: make(), holds: null, work: null };
    members.add(member);
    member.worker.listen(
      (message) => take(member, message),
      (reason) => lose(member, reason),
    );
    return member;
  };

  const feed = (): void => {
    const idle = [...members].filter(({ work }) => work === null);
    const waiting = [...runs].reduce((sum, run) => sum + run.waiting.length, 0);
    for (let more = waiting - idle.length; more > 0 && members.size < size; more--) {
      idle.push(hire());
    }
    for (const member of idle) give(member);
  };

  const give = (member: Member): void => {
    const inOrder = [...runs].sort((a, b) => Number(b.urgent) - Number(a.urgent));
    const run = inOrder.find(({ waiting }) => waiting.length > 0);
    if (!run) return;
    const at = Math.max(0, placeFor(run, member, knows));
    const [index] = run.waiting.splice(at, 1);
    const task = run.tasks[index];
    const thickness_mm = thicknessOf(task);
    if (thickness_mm !== null && !knows.has(thickness_mm)) knows.set(thickness_mm, member);
    member.work = { run, index };
    if (member.holds !== run.parsed) member.worker.post({ kind: 'load', parsed: run.parsed });
    member.holds = run.parsed;
    member.worker.post({ kind: 'do', id: tasks++, task });
  };

  const take = (member: Member, message: FromSweepWorker): void => {
    const { work } = member;
    member.work = null;
    // What comes back for a run that was cancelled is dropped here.
    if (work && runs.has(work.run)) {
      if (message.kind === 'failed') work.run.reject(new Error(message.message));
      else work.run.answered(work.index, message.answer);
    }
    feed();
  };

  const lose = (member: Member, reason: string): void => {
    if (!members.delete(member)) return;
    member.worker.end();
    for (const [thickness_mm, holder] of knows) {
      if (holder === member) knows.delete(thickness_mm);
    }
    const run = member.work?.run;
    if (run && member.work && runs.has(run)) {
      run.waiting.unshift(member.work.index);
      run.losses++;
      if (run.losses > mostLosses) run.reject(new WorkerLost(reason));
    }
    feed();
  };

  const run = <T extends RoomTask>(
    parsed: ParsedCase,
    tasks: readonly T[],
    { onAnswer, signal, urgent = false }: RunOptions<T> = {},
  ): Promise<AnswerTo<T>[]> => {
    let own: Run;
    return new Promise<AnswerTo<T>[]>((resolve, reject) => {
      signal?.throwIfAborted();
      const answers: AnswerTo<T>[] = new Array(tasks.length);
      let missing = tasks.length;
      const answered = (index: number, given: AnswerTo<RoomTask>): void => {
        const answer = given as AnswerTo<T>;
        answers[index] = answer;
        missing--;
        onAnswer?.(index, answer);
        if (missing === 0) resolve(answers);
      };
      own = { parsed, tasks, waiting: [...tasks.keys()], urgent, answered, reject, losses: 0 };
      if (missing === 0) return resolve(answers);
      signal?.addEventListener('abort', () => reject(signal.reason));
      runs.add(own);
      feed();
    }).finally(() => runs.delete(own));
  };

  return {
    run,
    isBusy: () => [...members].some(({ work }) => work !== null),
    end: () => {
      for (const { worker } of members) worker.end();
      members.clear();
      knows.clear();
      for (const { reject } of runs) reject(new WorkerLost('the pool was ended'));
    },
  };
}

/** Which of a run's waiting tasks suits a worker best: a thickness of its own, else one nobody has. */
const placeFor = (
  { tasks, waiting }: Run,
  member: Member,
  knows: ReadonlyMap<number, Member>,
): number => {
  const holderOf = (index: number): Member | null | undefined => {
    const thickness_mm = thicknessOf(tasks[index]);
    return thickness_mm === null ? null : knows.get(thickness_mm);
  };
  const own = waiting.findIndex((index) => holderOf(index) === member);
  return own >= 0 ? own : waiting.findIndex((index) => !holderOf(index));
};

import type { Mock } from './mock';
import type { Fault, FaultKind } from './records';

/** Uses up the first waiting fault of these kinds that fits the call; undefined when none waits. */
export function takeFault(
  mock: Pick<Mock, 'faults'>,
  kinds: readonly FaultKind[],
  call?: { method: string; path: string },
): Fault | undefined {
  const fault = mock.faults.find(
    ({ kind, remaining, method, path }) =>
      remaining > 0 &&
      kinds.includes(kind) &&
      (!call || !method || method === call.method) &&
      (!call || !path || call.path.startsWith(path)),
  );
  if (!fault) return undefined;
  fault.remaining -= 1;
  if (fault.remaining === 0) mock.faults.splice(mock.faults.indexOf(fault), 1);
  return fault;
}

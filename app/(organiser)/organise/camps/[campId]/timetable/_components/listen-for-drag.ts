type Dragged = { meetingId: string; updatedAt: string } | { workshopId: string };
type Cell = Record<string, string>;

/** Listens on the layer for what bubbles up from cards (`data-meeting`, `data-workshop`) and cells (`data-cell`). */
export function listenForDrag(
  layer: HTMLElement,
  onDrop: (dragged: Dragged, cell: Cell) => void,
): () => void {
  let dragged: Dragged | null = null;
  let over: HTMLElement | null = null;
  const find = (event: Event, what: string) =>
    event.target instanceof Element ? event.target.closest<HTMLElement>(what) : null;
  const mark = (cell: HTMLElement | null) => {
    if (over === cell) return;
    over?.removeAttribute('data-over');
    cell?.setAttribute('data-over', 'true');
    over = cell;
  };
  const stop = new AbortController();
  const listen = <K extends 'dragstart' | 'dragover' | 'dragend' | 'drop'>(
    name: K,
    run: (event: HTMLElementEventMap[K]) => void,
  ) => layer.addEventListener(name, run, { signal: stop.signal });

  listen('dragstart', (event) => {
    const { meeting, updated, workshop } = find(event, '[data-meeting],[data-workshop]')?.dataset ?? {};
    if (meeting && updated) dragged = { meetingId: meeting, updatedAt: updated };
    else dragged = workshop ? { workshopId: workshop } : null;
  });
  listen('dragover', (event) => {
    const cell = dragged && find(event, '[data-cell]');
    mark(cell);
    if (cell) event.preventDefault();
  });
  listen('dragend', () => mark(null));
  listen('drop', (event) => {
    const cell = find(event, '[data-cell]');
    mark(null);
    if (!cell || !dragged) return;
    event.preventDefault();
    onDrop(dragged, JSON.parse(cell.dataset.cell ?? '{}') as Cell);
  });
  return () => stop.abort();
}

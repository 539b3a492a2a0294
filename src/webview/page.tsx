import { Panel } from '../report/panel/panel';
import type { FromPanel } from '../protocol/fromPanel';
import type { ShownProblem } from '../protocol/places';
import type { Busy, Notice, Show, Tool } from '../protocol/toPanel';

interface PageProps {
  readonly show: Show | null;
  readonly busy: Busy | null;
  readonly send: (message: FromPanel) => void;
}

/** The whole page: what is going on, what must be known, then the comparison or why there is none. */
export function Page({ show, busy, send }: PageProps) {
  const { view, problem, revision, tools } = show ?? { view: null, problem: null, revision: 0, tools: [] };
  const isNotebook = ({ id }: Tool): boolean => id === 'addToNotebook';
  return (
    <>
      <Status show={show} busy={busy} />
      {show?.notices.map(notice => (
        <NoticeLine notice={notice} send={send} />
      ))}
      {problem !== null && show !== null && <ProblemPart problem={problem} words={show.words} send={send} />}
      <Tools tools={tools.filter(tool => !isNotebook(tool))} send={send} />
      {view !== null && <Panel view={view} send={action => send({ type: 'act', revision, action })} />}
      <Tools tools={tools.filter(isNotebook)} send={send} />
    </>
  );
}

/** Read out by screen readers whenever it changes; seen only while something is going on. */
function Status({ show, busy }: Pick<PageProps, 'show' | 'busy'>) {
  const known = busy !== null && busy.total > 0;
  return (
    <div role="status" class={busy === null ? 'page-status page-status-ready' : 'page-status'}>
      {busy === null ? <span class="page-unseen">{show?.words.ready}</span> : busy.says}
      {known && <progress value={busy.done} max={busy.total} aria-label={busy.says} />}
    </div>
  );
}

function Tools({ tools, send }: { readonly tools: readonly Tool[] } & Pick<PageProps, 'send'>) {
  if (tools.length === 0) return null;
  return (
    <p class="page-tools">
      {tools.map(({ id, label }) => (
        <button key={id} type="button" onClick={() => send({ type: 'tool', id })}>
          {label}
        </button>
      ))}
    </p>
  );
}

function NoticeLine({ notice, send }: { readonly notice: Notice } & Pick<PageProps, 'send'>) {
  const { action } = notice;
  return (
    <p class="page-notice">
      {notice.text}
      {action !== null && (
        <button type="button" onClick={() => send({ type: 'notice', id: action.id })}>
          {action.label}
        </button>
      )}
    </p>
  );
}

interface ProblemProps extends Pick<PageProps, 'send'> {
  readonly problem: ShownProblem;
  readonly words: Show['words'];
}

/** Why there is no number: what happened, where, and what to do. */
function ProblemPart({ problem, words, send }: ProblemProps) {
  return (
    <section class="page-problem" aria-label={words.problem}>
      <h1>{problem.message}</h1>
      {problem.where !== null && (
        <p>
          {problem.where}
          {problem.at !== null && (
            <button type="button" onClick={() => send({ type: 'showProblem' })}>
              {words.showCell}
            </button>
          )}
        </p>
      )}
      <p>{problem.fix}</p>
    </section>
  );
}

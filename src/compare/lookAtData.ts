import type { Comparison, Evidence, EvidenceDescriptor, Finding, Seen } from '../core/model/comparison';
import type { Ticker } from '../core/model/problem';

type Shown = Pick<Comparison, 'evidence' | 'findings' | 'quiet' | 'open'>;

const LEVELS: readonly Finding['level'][] = ['stop', 'ask', 'warn', 'note'];

/** Runs every check: statistics are evidence, the rest findings, gravest first; checks with nothing to say are counted. */
export function lookAtData(seen: Seen, checks: readonly EvidenceDescriptor[], tick: Ticker): Shown {
  const evidence: Evidence[] = [];
  const findings: Finding[] = [];
  let sawNothing = 0;
  let cannotTell = 0;
  for (const check of checks) {
    const before = findings.length;
    for (const shown of check.look(seen, tick)) {
      if ('statistic' in shown) evidence.push(shown);
      else findings.push(shown);
    }
    if (findings.length > before) continue;
    if (check.canTell(seen)) sawNothing += 1;
    else cannotTell += 1;
  }
  findings.sort((a, b) => LEVELS.indexOf(a.level) - LEVELS.indexOf(b.level));
  const open = findings.filter(({ level }) => level === 'ask').map(({ id }) => id);
  return { evidence, findings, quiet: { sawNothing, cannotTell }, open: [...new Set(open)] };
}

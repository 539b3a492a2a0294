import type { Relation, Settings } from '../core/model/settings';
import type { Request } from './request';

/** The part of a request that a part of Settings stands for: how a finding's answer is taken up. */
export function requestPatch(answer: Partial<Settings>): Partial<Request> {
  const {
    relation,
    numberingRestarts,
    layout,
    reading,
    options,
    test,
    reference,
    margin,
    matters,
    rows,
    ...same
  } = answer;
  const { measure, method, question, confidence, against, where, leftOut, files } = same;
  return {
    ...defined({ measure, method, question, confidence, against, where, files, same: same.same }),
    ...defined({ leaveOut: leftOut, options }),
    ...defined({ test: test ?? undefined, reference: reference ?? undefined }),
    ...defined({ margin: margin ?? undefined, matters: matters ?? undefined }),
    ...(rows === undefined || rows === 'all' ? {} : { rows }),
    ...(relation === undefined ? {} : relationPatch(relation)),
    ...(numberingRestarts === true ? { pair: 'none' } : {}),
    ...(layout === undefined ? {} : layoutPatch(layout)),
    ...(reading === undefined ? {} : { wish: readingPatch(reading) }),
  };
}

function relationPatch(relation: Relation): Partial<Request> {
  switch (relation.kind) {
    case 'rows':
      return {};
    case 'independent':
      return { per: 'none' };
    case 'units':
      return { per: relation.columns };
    case 'pairs':
      return { pair: relation.column };
  }
}

function layoutPatch(layout: Settings['layout']): Partial<Request> {
  switch (layout.kind) {
    case 'long':
      return { measured: layout.measured, label: layout.label };
    case 'wide':
      return { columns: layout.columns };
    case 'files':
      return { measured: [layout.measured] };
    case 'summary':
      return { summary: true, label: layout.label };
    case 'typed':
      return { typed: layout.groups };
  }
}

function readingPatch({
  encoding,
  delimiter,
  decimal,
  header,
  missing,
  below,
}: Settings['reading']): Request['wish'] {
  return { encoding, delimiter, decimal, header, missing, below };
}

type Defined<T> = { [K in keyof T]?: Exclude<T[K], undefined> };

/** Drops the keys that are not set: a request never holds an explicit undefined. */
function defined<T extends object>(parts: T): Defined<T> {
  return Object.fromEntries(Object.entries(parts).filter(([, value]) => value !== undefined)) as Defined<T>;
}

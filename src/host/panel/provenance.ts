import type { Provenance } from '../../core/model/settings';

/** The record of a comparison nobody has said anything about yet; its first result is the first look. */
export const freshProvenance: Provenance = {
  questionInWords: '',
  sampling: '',
  analyst: '',
  reasons: {},
  changed: [],
  looks: 1,
  plan: null,
  replaces: null,
};

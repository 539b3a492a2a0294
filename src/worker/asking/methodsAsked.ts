import type { Question } from '../../core/model/settings';
import type { MethodDescriptor } from '../../core/model/methods';
import type { Request } from '../../compare/request';
import { methods } from '../../core/methods/index';
import { designAsked } from './design';

type Described = Pick<MethodDescriptor, 'id' | 'questions' | 'title' | 'assumes'>;

/** The methods of the registry that suit the comparison asked for, in the registry's order. */
export function methodsAsked(request: Partial<Request>): readonly Described[] {
  const { design, measure } = designAsked(request);
  return methods
    .filter(method => method.design === design && method.measure === measure)
    .filter(method => request.question === undefined || asks(method, request.question))
    .filter(method => request.summary !== true || method.needs === 'summary')
    .filter(method => request.sigma !== undefined || !method.options.some(needsSigma));
}

const asks = (method: Described, question: Question): boolean => method.questions.some(q => q === question);

/** Known standard deviations come from elsewhere than the file: a method that needs them is not offered without. */
const needsSigma = (option: { readonly key: string; readonly default: unknown }): boolean =>
  option.key === 'sigma' && option.default === null;

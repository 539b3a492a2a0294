import { choice, isAnswered, type Asker } from './askContext';
import { methodsAsked } from './methodsAsked';

/** Under which variance assumption, or by which method: each with what choosing it claims. */
export const varianceStep: Asker = context => {
  const { t, request } = context;
  if (isAnswered(context, 'variance', 'method', 'variance', 'df', 'curve')) return null;
  const items = methodsAsked(request).map((method, index) => ({
    label: method.title(t),
    description: index === 0 ? t('usual') : '',
    detail: method.assumes(t),
    adds: { method: method.id },
  }));
  const only = items[0];
  if (only === undefined || items.length === 1) return only === undefined ? null : { plain: only.adds };
  const title =
    request.measure === 'proportion' ? t('By which method?') : t('Under which assumption, by which method?');
  return choice(context, {
    title,
    prompt: t('The others are shown beside it, whichever is chosen'),
    items,
  });
};

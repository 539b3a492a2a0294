import { test } from 'vitest';
import { textReport } from '../../src/report/text';
import { batches, crazed, firings, leaching, mills, shown, uptake } from './fixtures/cases';
test('try', () => {
  for (const [name, make] of Object.entries({ firings, crazed, leaching, uptake, mills, batches })) {
    console.log(`########## ${name}\n` + textReport(shown(make())));
  }
  console.log(textReport(shown(firings({ question: 'higher', matters: 15 }))));
  console.log(textReport(shown(firings({ question: 'equivalent', margin: [-5, 5] }))));
});

import { readFileSync } from 'node:fs';
import { it } from 'vitest';
import { evaluate } from '/work/main/core/evaluate';
it('t', () => { const s = JSON.parse(readFileSync('/work/main/assets/demo/white-base.sunder.json','utf8'));
 for (let k=0;k<3;k++){ const t=performance.now(); evaluate(s); console.log('all', performance.now()-t);}
 for (const f of s.formulations){ const t=performance.now(); const e=evaluate({...s,formulations:[f]}); console.log(f.name, performance.now()-t, e.formulations[0].result.pairs[0].curve.separation_m.length);}
});

import { readFileSync } from 'node:fs';
import * as N from '../helpers/ngspice-transient';
const rec=JSON.parse(readFileSync('tests/fixtures/ngspice-transient.json','utf8'));
for (const opt of ['reltol=1e-5 abstol=1e-9 vntol=1e-9 trtol=7','reltol=1e-4 abstol=1e-6 vntol=1e-6 trtol=7','reltol=1e-4 abstol=1e-6 vntol=1e-6 trtol=7 method=gear','reltol=1e-3 abstol=1e-6 vntol=1e-6 trtol=7 method=gear']) for (const k of ['six lines, package and die, seen at the pins','twelve lines and planes, hold shorter than the ringing']) for (const m of [1e-8,1e-9,1e-10,2e-11]) { const r=N.runTransient(rec[k].deck.replace(/\.options.*/,'.options '+opt),m); console.log(opt,k.slice(0,10),m,r.time_s.length,r.time_s.at(-1),JSON.stringify(N.extremesOf(r))); }

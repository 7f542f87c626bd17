import { test } from 'vitest';
import { csvOf, table } from './rows.ts';
import * as g from './built-in-gases.ts';
import { meanSpeed } from '../../src/physics/state.ts';
const pc=(x:number)=>((x-1)*100).toFixed(1);
test('x', () => {
  const by: Record<string,string[]> = {};
  for (const [gas='',t='',mu=''] of csvOf('viscosity')) {
    const ours = gas==='air'? g.airViscosity(+t): g.viscosityOf(g.gasNamed(gas),+t);
    (by[gas]??=[]).push(t+':'+pc(ours/(+mu*1e-6)));
  }
  for (const k in by) console.log('visc',k,by[k]!.join(' '));
  for (const [a='',b='',t='',D=''] of csvOf('diffusion')) {
    const ours = b==='air'? g.diffusivityInAir(g.gasNamed(a),+t,101325): g.diffusivityOf(g.gasNamed(a),g.gasNamed(b),+t,101325);
    console.log('diff',a,b,t,pc(ours/(+D*1e-4)));
  }
  for (const [n,v] of Object.entries(table('mean-free-path').values)) { const x=g.gasNamed(n); const l=g.pathOf(x,1e5,298.15); console.log('mfp',n,pc(l*1e9/v[1]!), pc(meanSpeed(x.molarMass,298.15)/v[2]!), pc(l/meanSpeed(x.molarMass,298.15)*1e12/v[3]!), pc(g.viscosityOf(x,298.15)*1e6/v[4]!)); }
  for (const [n,v] of Object.entries(table('path-0-degC').values)) { const x=g.gasNamed(n); const l=g.pathOf(x,101325,273.15); console.log('kl',n,pc(meanSpeed(x.molarMass,273.15)/v[0]!),pc(l*1e9/v[1]!),pc(l/meanSpeed(x.molarMass,273.15)*1e12/v[2]!)); }
  for (const [n,v] of Object.entries(table('path-times-pressure').values)) { if(n==='air') continue; const x=g.gasNamed(n); console.log('lp',n,pc(g.pathOf(x,1,273.15)/v[0]!)); }
  for (const [n,v] of Object.entries(table('gas-kinetic-cross-section').values)) { const [a='',b='']=n.split('-'); console.log('cs',n,pc(g.crossSectionOf(g.gasNamed(a),g.gasNamed(b),300)/v[0]!)); }
  for (const [n,v] of Object.entries(table('viscosity').values)) console.log('crc',n,v.map((m,i)=>m===null?'-':pc((n==='air'?g.airViscosity((i+1)*100):g.viscosityOf(g.gasNamed(n),(i+1)*100))*1e6/m)).join(' '));
  for (const [n,v] of Object.entries(table('variable-hard-sphere').values)) console.log('vhs',n,pc(g.viscosityOf(g.gasNamed(n),273)/v[0]!));
  for (const [n,v] of Object.entries(table('sutherland').values)) { const f=(t:number)=>v[0]!*(t/v[1]!)**1.5*(v[1]!+v[2]!)/(t+v[2]!); const o=(t:number)=>n==='air'?g.airViscosity(t):g.viscosityOf(g.gasNamed(n),t); console.log('suth',n,pc(o(300)/f(300)),pc(o(600)/f(600))); }
});

/** What a newcomer needs to look round. The demo is for this machine only. */
export const demoSignIns = `Demo workshop "Tarnside Outfitters", password for all: true-litres-2026
  manager@tarnside.example    manager
  designer@tarnside.example   designer
  fitter@tarnside.example     fitter
  owner@tarnside.example      owner`;

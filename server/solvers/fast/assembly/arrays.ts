/**
 * Where the arrays of the workspace stand in memory (bytes), by their names there, and its numbers. fastKernel.ts sets
 * them before the first call. Entry i of an array of doubles is at `name + (i << 3)`, of integers at `name + (i << 2)`.
 */
export let n: i32 = 0;
export let dx: f64 = 0;
export let gravity: f64 = 0;
export let dryDepth: f64 = 0;

export let area: usize = 0;
export let flow: usize = 0;
export let stage: usize = 0;
export let width: usize = 0;
export let celerity: usize = 0;
export let reach: usize = 0;
export let friction: usize = 0;
export let level: usize = 0;
export let levelZ: usize = 0;
export let levelArea: usize = 0;
export let levelEnd: usize = 0;
export let levelB0: usize = 0;
export let levelB1: usize = 0;
export let levelV0: usize = 0;
export let levelV1: usize = 0;
export let levelV2: usize = 0;
export let slopeStage: usize = 0;
export let slopeFlow: usize = 0;
export let slopeFloor: usize = 0;
export let fluxArea: usize = 0;
export let fluxLeft: usize = 0;
export let fluxRight: usize = 0;
export let oldArea: usize = 0;
export let halfFlow: usize = 0;
export let implicitShare: usize = 0;
export let lateralRate: usize = 0;
export let lateralSums: usize = 0;
export let bed: usize = 0;
export let table: usize = 0;
export let levels: usize = 0;

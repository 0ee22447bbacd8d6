import { Corners } from './corners';
import type { Prepared } from './prepare';
import { Programme, SHIFT } from './programme';
import { PseudoCost } from './pseudo-cost';
import { type Rows, rowMeasure } from './rows';
import { directionRange, type Sector, sectorWorth, splitSector, towards } from './sector';

export type SectorState = 'more' | 'found' | 'done' | 'stuck';

/** How a child differs from its node: the sector of a row, or a limit on a part's count (beyond its minimum). */
type Branch = { row: number; sector: Sector } | { part: number; limit: number; isLeast: boolean };

/** A node on the path: its solved programme, its children, the next of them, and the sector that the present child has replaced. */
interface Frame {
  size: number;
  state: Float64Array;
  branches: Branch[];
  next: number;
  replaced: Sector | null;
  /** What was branched on, for the pseudo-costs: its number and by how much it was violated. */
  thing: number;
  violation: number;
}

/** First sectors are no wider than this, later ones are halves (measured: 45° and 90° take about twice the nodes on case 4). */
const WIDEST = Math.PI / 3;
/** A row is split while the mix misses it by more than this (relative to the target); then counts are made whole. */
const VIOLATED = 1e-6;
/** Rows violated at least this share of the worst are considered for splitting. */
const CONSIDERED = 0.05;
/** A sector is not cut below this; the tree then gives up rather than go round in rounding noise. */
const NARROWEST = 1e-6;

/**
 * Branch and bound for large banks, over the phase instead of the counts. Counts are fractional and the node is a linear
 * programme over the simplex of mixes of weight ≤ budget (corners.ts, programme.ts) with
 *   – for every row the interpolation bound of surrogate-prune.ts, Σ t_c·φ(V_c) ≥ 0, and
 *   – for rows that have been split the three conditions of their sector (sector.ts).
 * If it is cut, no mix within the budget takes these sectors. Otherwise its best mix is looked at: of the rows that it misses
 * the one whose splitting promises most (pseudo-cost.ts) is split into sectors; if it misses none, a count that is not whole is
 * branched on, at most ⌊n⌋ or at least ⌊n⌋ + 1. The children cover all of the parent's mixes, so an empty tree proves that no mix of weight ≤ budget exists. The tree needs few
 * nodes where many pieces share the work (fractions cost little) and many where few do: there the counts' tree wins.
 */
export class SectorTree {
  nodes = 0;
  budget = 0;
  private readonly prepared: Prepared;
  private rows: Rows;
  private corners: Corners;
  private readonly programme: Programme;
  private readonly frames: Frame[] = [];
  private depth = -1;
  private isFresh = false;
  private sectors: (Sector | null)[] = [];
  private readonly worth: Float64Array;
  private readonly mixture: Float64Array;
  private readonly found: Int32Array;
  private measures = new Float64Array(0);
  /** Rows count twice: never split yet, and split already; then the parts. */
  private costs = new PseudoCost(0);
  private thing = 0;
  private violation = 1;

  constructor(prepared: Prepared, rows: Rows) {
    const k = prepared.parts.length;
    this.prepared = prepared;
    this.rows = rows;
    this.programme = new Programme(k + 1);
    this.corners = new Corners(prepared, rows, 0);
    this.worth = new Float64Array(k + 1);
    this.mixture = new Float64Array(k + 1);
    this.found = new Int32Array(k);
  }

  /** Begins a tree for mixes of weight ≤ `budget` on `rows`. */
  start(budget: number, rows: Rows): void {
    this.rows = rows;
    this.budget = budget;
    this.corners = new Corners(this.prepared, rows, budget);
    this.sectors = new Array<Sector | null>(rows.size).fill(null);
    if (this.measures.length !== rows.size) {
      this.measures = new Float64Array(rows.size);
      this.costs = new PseudoCost(2 * rows.size + this.found.length);
    }
    this.programme.reset();
    const { worth, corners } = this;
    for (const f of rows.convex) {
      for (let c = 0, at = f * corners.count; c < corners.count; c++, at++)
        worth[c] = rowMeasure(rows, f, corners.x[at], corners.y[at]);
      this.programme.add(worth, rows.margin[f]);
    }
    this.prepared.parts.forEach((part, k) => {
      const limit = part.max - part.min;
      if (limit < corners.most(k)) this.addLimit(k, limit, false);
    });
    this.depth = -1;
    this.isFresh = true;
  }

  /** Works on `limit` nodes at most. 'found': `mix()` meets all rows. 'stuck': nothing can be concluded for this budget. */
  run(limit: number): SectorState {
    const end = this.nodes + limit;
    while (this.nodes < end) {
      if (this.isFresh) {
        this.isFresh = false;
      } else {
        if (this.depth < 0) return 'done';
        if (!this.toNextChild(this.frames[this.depth])) {
          this.depth--;
          continue;
        }
      }
      this.nodes++;
      const before = this.programme.total;
      const isCut = this.programme.solve() === 'cut';
      if (this.depth >= 0) {
        const { thing, violation } = this.frames[this.depth];
        this.costs.learn(thing, violation, (isCut ? 1 / SHIFT : this.programme.total) - before);
      }
      if (isCut) continue;
      const branches = this.branch();
      if (!branches) return this.isWhole() ? 'found' : 'stuck';
      this.push(branches);
    }
    return 'more';
  }

  /** Counts with the minima, in prepared order. */
  mix(): Int32Array {
    return this.found.map((n, k) => n + this.prepared.parts[k].min);
  }

  /** Sets the programme up for the next child; false when there is none. */
  private toNextChild(frame: Frame): boolean {
    const before = frame.branches[frame.next - 1];
    if (before && 'row' in before) this.sectors[before.row] = frame.replaced;
    if (frame.next === frame.branches.length) return false;
    this.programme.truncate(frame.size);
    this.programme.load(frame.state);
    this.apply(frame, frame.branches[frame.next++]);
    return true;
  }

  private push(branches: Branch[]): void {
    this.depth++;
    const { programme } = this;
    let frame = this.frames[this.depth];
    if (!frame) {
      const state = new Float64Array(programme.stateSize);
      frame = { size: 0, state, branches, next: 0, replaced: null, thing: 0, violation: 1 };
      this.frames[this.depth] = frame;
    }
    frame.size = programme.size;
    frame.branches = branches;
    frame.next = 0;
    frame.thing = this.thing;
    frame.violation = this.violation;
    programme.save(frame.state);
  }

  private apply(frame: Frame, branch: Branch): void {
    if ('part' in branch) {
      this.addLimit(branch.part, branch.limit, branch.isLeast);
      return;
    }
    frame.replaced = this.sectors[branch.row];
    this.sectors[branch.row] = branch.sector;
    const { corners, worth } = this;
    for (let e = 0; e < 3; e++) {
      for (let c = 0, at = branch.row * corners.count; c < corners.count; c++, at++) {
        towards(this.rows, branch.row, corners.x[at], corners.y[at], direction);
        sectorWorth(branch.sector, direction[0], direction[1], three);
        worth[c] = three[e];
      }
      this.programme.add(worth, this.rows.margin[branch.row]);
    }
  }

  /** n_part ≥ limit or ≤ limit, as a condition on the corners' weights (n = t·most). */
  private addLimit(part: number, limit: number, isLeast: boolean): void {
    const share = limit / this.corners.most(part);
    const sign = isLeast ? 1 : -1;
    this.worth.fill(-sign * share);
    this.worth[part + 1] = sign * (1 - share);
    this.programme.add(this.worth, 1e-9);
  }

  /** Children of the node just solved; null when its best mix is whole and meets all rows, or nothing can be split. */
  private branch(): Branch[] | null {
    const { corners, mixture, programme } = this;
    let total = 0;
    for (let c = 0; c < corners.count; c++) total += Math.max(0, programme.price[c]);
    for (let c = 0; c < corners.count; c++) mixture[c] = Math.max(0, programme.price[c]) / total;
    const least = corners.measure(this.rows, mixture, this.measures);
    if (least < -VIOLATED) return this.splitRow(this.mostPromisingRow(least));
    const part = this.mostPromisingPart();
    if (part < 0) return this.isWhole() ? null : this.splitRow(this.mostPromisingRow(least));
    const limit = Math.floor(mixture[part + 1] * corners.most(part));
    return [
      { part, limit, isLeast: false },
      { part, limit: limit + 1, isLeast: true },
    ];
  }

  private mostPromisingRow(least: number): number {
    const { rows, measures, costs, sectors } = this;
    let row = -1;
    let most = 0;
    for (let j = 0; j < rows.convex.length; j++) {
      const f = rows.convex[j];
      if (!(measures[f] < CONSIDERED * least)) continue;
      const thing = 2 * f + (sectors[f] ? 1 : 0);
      const promise = -measures[f] * costs.expect(thing);
      if (row >= 0 && promise <= most) continue;
      most = promise;
      row = f;
      this.thing = thing;
      this.violation = -measures[f];
    }
    return row;
  }

  /** −1 when all counts of the best mix are whole. */
  private mostPromisingPart(): number {
    const { corners, mixture, rows, costs } = this;
    let part = -1;
    let most = 0;
    for (let k = 0; k < this.found.length; k++) {
      const count = mixture[k + 1] * corners.most(k);
      const fraction = Math.abs(count - Math.round(count));
      if (fraction <= 1e-6) continue;
      const thing = 2 * rows.size + k;
      const promise = fraction * costs.expect(thing);
      if (part >= 0 && promise <= most) continue;
      most = promise;
      part = k;
      this.thing = thing;
      this.violation = fraction;
    }
    return part;
  }

  /** Rounds the best mix to whole counts; true when that is a mix within budget and kinds that meets all rows. */
  private isWhole(): boolean {
    const { prepared, rows, corners, found, mixture } = this;
    let weight = prepared.baseWeight;
    let kinds = prepared.baseKinds;
    for (let k = 0; k < found.length; k++) {
      found[k] = Math.round(mixture[k + 1] * corners.most(k));
      weight += found[k] * prepared.parts[k].weight;
      if (found[k] > 0 && prepared.parts[k].min === 0) kinds++;
    }
    if (weight > this.budget || kinds > prepared.maxKinds) return false;
    return rows.exact.every((f) => {
      let x = rows.y0x[f];
      let y = rows.y0y[f];
      for (let k = 0; k < found.length; k++) {
        x += found[k] * rows.yx[k][f];
        y += found[k] * rows.yy[k][f];
      }
      return rowMeasure(rows, f, x, y) >= -1e-11;
    });
  }

  private splitRow(row: number): Branch[] | null {
    if (row < 0) return null;
    const known = this.sectors[row];
    if (known && known.to - known.from < NARROWEST) return null;
    if (known) return splitSector(known, Math.PI).map((sector) => ({ row, sector }));
    const { corners, rows } = this;
    const points = new Float64Array(2 * corners.count);
    for (let c = 0, at = row * corners.count; c < corners.count; c++, at++) {
      towards(rows, row, corners.x[at], corners.y[at], direction);
      points[2 * c] = direction[0];
      points[2 * c + 1] = direction[1];
    }
    return splitSector(directionRange(points), WIDEST).map((sector) => ({ row, sector }));
  }
}

const direction = new Float64Array(2);
const three = new Float64Array(3);

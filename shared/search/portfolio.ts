import { boundAbove, budgetBelow, isClosed, nextBudget } from './budget';
import { CountTree } from './count-tree';
import type { MixStage } from './mix-stage';
import { SectorTree } from './sector-tree';

/** Turns: nodes of the counts' tree and of the sectors' tree that take about the same time (some 8 ms). */
const COUNT_TURN = 2048;
const SECTOR_TURN = 256;
/** Every so many turns the mix gets some rounds of destroy and repair: about a tenth of the time. */
const IMPROVE_EVERY = 8;
const IMPROVE_ROUNDS = 16;
/** The size of problem for which the numbers above are meant. */
const USUAL_PARTS = 16;
const USUAL_ROWS = 190;
/** A pass of the counts' tree this long is a sign of a large bank: the sectors' tree joins in. */
const JOIN_AFTER = 40_000;
/** Turns that the tree which closed the last budget gets for each one of the other. */
const FAVOUR = 3;

/**
 * The proof by iterative deepening on the budget, with two trees that are good at different things: the counts' tree where
 * the bank is small (whole numbers cost much), the sectors' tree where it is large (phase costs much). Both work on the same
 * budget in turns measured in nodes, not in time, so a search repeats exactly; whichever empties its tree first raises the
 * bound for both, and every mix that either finds goes to the engine and from there to both.
 */
export class Portfolio {
  /** No mix weighs less (units of prepared weight). */
  bound: number;
  private readonly stage: MixStage;
  private readonly most: number;
  private readonly count: CountTree;
  private readonly sector: SectorTree;
  private isRunning = false;
  private isJoined = false;
  private isStuck = false;
  private passStart = 0;
  private favourite: 'count' | 'sector' = 'count';
  private turn = 0;
  private turnLeft = 0;

  constructor(stage: MixStage) {
    const { prepared } = stage;
    this.stage = stage;
    this.bound = prepared.baseWeight;
    this.most = (1 + 1e-9) * prepared.parts.reduce((sum, part) => sum + part.max * part.weight, 0);
    this.count = new CountTree(prepared, stage.rows);
    this.sector = new SectorTree(prepared, stage.rows);
  }

  get nodes(): number {
    return this.count.nodes + this.sector.nodes;
  }

  get isClosed(): boolean {
    const { incumbent, prepared } = this.stage;
    return incumbent !== null && isClosed(prepared, this.bound, incumbent.weight);
  }

  /** Works on some `slice` nodes. 'exhausted': no mix whatever is left and none was found. */
  step(slice: number): 'more' | 'exhausted' {
    if (!this.isRunning) this.startPass();
    if (this.turnLeft <= 0) this.nextTurn();
    const isSector = this.isSectorTurn();
    const tree = isSector ? this.sector : this.count;
    const before = tree.nodes;
    const state = tree.run(
      Math.max(1, Math.min(slice, this.turnLeft, this.paced(isSector ? SECTOR_TURN : COUNT_TURN))),
    );
    this.turnLeft -= tree.nodes - before;
    if (state === 'found') this.take(tree);
    if (state === 'stuck') {
      this.isStuck = true;
      this.turnLeft = 0;
    }
    if (state !== 'done') return 'more';
    this.favourite = isSector ? 'sector' : 'count';
    this.isRunning = false;
    this.bound = Math.max(this.bound, boundAbove(this.stage.prepared, tree.budget));
    return !this.stage.incumbent && tree.budget >= this.most ? 'exhausted' : 'more';
  }

  private startPass(): void {
    const { prepared, incumbent } = this.stage;
    this.count.start(
      nextBudget(prepared, this.bound, incumbent?.weight ?? null, this.most, this.stage.scale),
    );
    this.passStart = this.count.nodes;
    this.isRunning = true;
    this.isJoined = false;
    this.isStuck = false;
    this.turn = 0;
    this.turnLeft = 0;
    if (this.favourite === 'sector') this.join();
  }

  private join(): void {
    this.isJoined = true;
    this.sector.start(this.count.budget, this.stage.rows);
  }

  private isSectorTurn(): boolean {
    if (!this.isJoined || this.isStuck) return false;
    const isFavoured = this.turn % (FAVOUR + 1) !== 0;
    return isFavoured === (this.favourite === 'sector');
  }

  /** A number of nodes or rounds, fewer where each takes longer, so that a step stays within some 10 ms. */
  private paced(count: number): number {
    const { rows, prepared } = this.stage;
    return Math.max(
      1,
      Math.round(count * Math.min(1, (USUAL_PARTS * USUAL_ROWS) / (prepared.parts.length * rows.size))),
    );
  }

  private nextTurn(): void {
    const parts = this.stage.prepared.parts.length;
    if (this.turn % IMPROVE_EVERY === IMPROVE_EVERY - 1)
      for (let round = 0; round < this.paced(IMPROVE_ROUNDS); round++)
        if (this.stage.improve()) this.afterImprovement();
    if (!this.isJoined && this.count.nodes - this.passStart > JOIN_AFTER) this.join();
    this.turn++;
    this.turnLeft = this.isSectorTurn()
      ? Math.ceil(SECTOR_TURN * Math.min(1, USUAL_PARTS / parts))
      : COUNT_TURN;
  }

  /** Destroy and repair found a lighter mix while the trees were at work. */
  private afterImprovement(): void {
    const { incumbent, prepared } = this.stage;
    if (!incumbent) return;
    const budget = budgetBelow(prepared, incumbent.weight);
    if (budget >= this.count.budget) return;
    this.count.lower(budget);
    if (this.isJoined) this.join();
  }

  /** Brings a mix that holds on the rows to the engine and tells both trees. */
  private take(tree: CountTree | SectorTree): void {
    const { stage } = this;
    const { prepared } = stage;
    const mix = tree.mix();
    const weight = mix.reduce((sum, n, k) => sum + n * prepared.parts[k].weight, 0);
    const answer = stage.offer(mix, weight);
    if (tree === this.count) {
      if (answer === 'grown') this.count.setRows(stage.rows);
      if (answer === 'held') this.count.accept(budgetBelow(prepared, weight));
      else this.count.reject();
      // the sectors' tree, if it runs, is on a budget that may now be too large: it starts anew with the next pass
      if (answer === 'held' && this.isJoined) this.join();
      return;
    }
    if (answer === 'grown') this.count.setRows(stage.rows);
    if (answer === 'held') this.count.lower(budgetBelow(prepared, weight));
    if (answer === 'refused') this.isStuck = true;
    else this.join();
  }
}

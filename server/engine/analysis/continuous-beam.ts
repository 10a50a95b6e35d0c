import { BeamFrame } from './beam-frame';
import type { BeamState } from './beam-state';
import { BeamSystem } from './beam-system';
import type { BeamGeometry, BeamLoad } from './beam.types';

/**
 * A member of one section over two or more supports, solved exactly by the stiffness method.
 *
 * ```ts
 * const beam = new ContinuousBeam(geometry, loads);
 * const state = beam.solve(loads);
 * ```
 */
export class ContinuousBeam {
  readonly frame: BeamFrame;
  /** Indices of all supports: 0 to n. */
  readonly allSupports: readonly number[];
  private readonly systems = new Map<number, BeamSystem | null>();

  /** @param loads every load that will be solved for (or its clipped parts): they set the breakpoints. */
  constructor(geometry: BeamGeometry, loads: readonly BeamLoad[]) {
    this.frame = new BeamFrame(geometry, loads);
    this.allSupports = Array.from(this.frame.supports, (_, i) => i);
  }

  /**
   * The beam on the given supports, factorised once and kept. Null: a mechanism.
   *
   * @param acting indices of supports, ascending.
   */
  system(acting: readonly number[] = this.allSupports): BeamSystem | null {
    const key = supportKey(acting);
    let system = this.systems.get(key);
    if (system === undefined) {
      system = BeamSystem.build(this.frame, acting);
      this.systems.set(key, system);
    }
    return system;
  }

  /** @throws RangeError when the member is a mechanism on these supports. */
  solve(loads: readonly BeamLoad[], acting: readonly number[] = this.allSupports): BeamState {
    const system = this.system(acting);
    if (!system) throw new RangeError(`a mechanism on ${acting.length} supports`);
    return system.solve(this.frame.loadVector(loads));
  }
}

/** A set of supports as one number, bit by bit; exact up to 53 supports. */
export function supportKey(acting: readonly number[]): number {
  let key = 0;
  for (const support of acting) key += 2 ** support;
  return key;
}

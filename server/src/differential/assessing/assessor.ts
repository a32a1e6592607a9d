import { Worker } from 'node:worker_threads';
import { Injectable, type OnApplicationShutdown } from '@nestjs/common';
import type { PanelView } from '@weighhouse/shared/contracts/differential';
import { AssessingThread } from './assessing-thread.js';
import { type Answers, type Asked, computations } from './computations.js';
import { isHeavy } from './cost.js';

/** The built program, also where the sources run: Node runs a thread's program as it is, and with built packages. */
const program = new URL('../../../dist/differential/assessing/assessing-program.js', import.meta.url);
const startProgram = (): Worker => new Worker(program, { execArgv: [] });

/**
 * Where every panel is computed: the light ones at once, the heavy ones in a thread, so that one case holds up no
 * other. Standings, which are pushed first, have a thread of their own and never wait behind a whole assessment.
 */
@Injectable()
export class Assessor implements OnApplicationShutdown {
  private readonly standings = new AssessingThread(startProgram);
  private readonly wholes = new AssessingThread(startProgram);

  /** @throws PanelRefused */
  async ask<K extends Asked>(asked: K, panel: PanelView): Promise<Answers[K]> {
    if (!isHeavy(panel, asked)) return computations[asked](panel);
    return (asked === 'whole' ? this.wholes : this.standings).ask(asked, panel);
  }

  async onApplicationShutdown(): Promise<void> {
    await Promise.all([this.standings.close(), this.wholes.close()]);
  }
}

import { type Computer, sizeOfJob } from "../../workspace/computer.js";
import type { EndableComputer } from "./workerComputer.js";

/** Bytes of data from which on a job goes to the worker: less is done before the worker would have answered. */
export const workerFrom = 200_000;

/** Small jobs here, big ones in the worker: reading and fitting big data never holds the message loop. */
export function bySize(here: Computer, worker: EndableComputer): EndableComputer {
  return {
    compute: (job, signal) => (sizeOfJob(job) < workerFrom ? here : worker).compute(job, signal),
    end: () => worker.end(),
  };
}

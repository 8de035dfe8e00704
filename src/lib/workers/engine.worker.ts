import { engineHandlers } from './engine-handlers';
import type { EngineJobs } from './engine-jobs';
import type { FromWorker, Port, ToWorker } from './protocol';
import { serveJobs } from './serve';

// Inside a worker `self` is its end of the line; the DOM types know it as a window.
serveJobs(self as unknown as Port<FromWorker, ToWorker<EngineJobs>>, engineHandlers);

/** Prints the made-up measured project; a process of its own, because the test runner loads no JSON modules. */
import { measuredProject } from './measuredProject';

process.stdout.write(measuredProject(process.argv[2]!));

/**
 * Prints by how many megabytes one bundle raises the greatest memory this process ever held. Run in a
 * process of its own, since that figure never goes down: `bundle-peak.ts STAVES COURSES`.
 */
import { bundleZipOf } from './bundle-zip';
import { checkerLayout } from './checker-layout';

const [staves = 0, courses = 0] = process.argv.slice(2).map(Number);
const layout = checkerLayout(staves, courses);
const before = process.resourceUsage().maxRSS;
bundleZipOf(layout);
process.stdout.write(String((process.resourceUsage().maxRSS - before) / 1024));

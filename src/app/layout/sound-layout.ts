/** What drawings and checks read of the open layout: only what changed for them, and only what holds together. */
import { computed, linkedSignal, type Signal } from '@angular/core';
import type { CheckResult } from '@shared/checks/check';
import { contrast } from '@shared/checks/contrast';
import { runShapeChecks } from '@shared/checks/run-checks';
import { problemsOf } from '@shared/layout/consistency';
import { woodsSideBySide } from '@shared/layout/neighbours';
import { sameValue } from '@shared/layout/patch';
import type { Layout } from '@shared/layout/schema';

/**
 * The document for drawings and checks: it changes only when something besides the pattern does, and stays
 * at the last one that holds together while two people's edits together do not.
 */
export function soundLayoutOf(layout: Signal<Layout>): Signal<Layout> {
  return linkedSignal<Layout, Layout>({
    source: computed(() => layout(), { equal: sameBesidesPattern }),
    computation: (now, previous) => (previous && problemsOf(now).length > 0 ? previous.value : now),
  });
}

/** Every check; those of the shape run again only when the sound layout changes. */
export function checksOf(layout: Signal<Layout>, sound: Signal<Layout>): Signal<CheckResult[]> {
  const shapeChecks = computed(() => runShapeChecks(sound()));
  // asked for at every touch, and the same as long as no other woods meet: so no check runs again
  const neighbours = computed(() => woodsSideBySide(layout().shell, layout().cells), {
    equal: sameValue,
  });
  const woods = computed(() => layout().woods);
  return computed(() => [...shapeChecks(), contrast(woods(), neighbours())]);
}

function sameBesidesPattern(a: Layout, b: Layout): boolean {
  return (
    a.shell === b.shell &&
    a.joint === b.joint &&
    a.cutter === b.cutter &&
    a.build === b.build &&
    a.lengthUnit === b.lengthUnit
  );
}

import { Component, computed, inject, linkedSignal, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatDialog } from '@angular/material/dialog';
import { closeProfile } from '@shared/joint/edge-profile';
import type { JointParameters, Scheme } from '@shared/joint/parameters';
import { isWave } from '@shared/joint/round-profile';
import { sameValue } from '@shared/layout/patch';
import { BOUNDS } from '@shared/layout/schema';
import { AngleField } from '../../drawing/angle-field';
import { ChoiceBar, type Choice } from '../../drawing/choice-bar';
import { FigureText } from '../../drawing/figure-text';
import { jointPicture } from '../../drawing/joint-picture';
import { LengthField } from '../../drawing/length-field';
import { PictureView, type PictureMaker } from '../../drawing/picture';
import { Announcer } from '../../platform/announcer';
import { Findings } from '../findings';
import { LayoutProposal } from '../layout-proposal';
import { LayoutStore } from '../layout-store';
import { jointFields, jointFieldValue, withJointField } from './joint-fields';
import { jointFindings, largestCutter, taperText } from './joint-findings';
import { edgeLengthOf, jointShown, wishesFor, type JointTarget } from './joint-target';
import { otherProfile } from './other-profile';
import { SmallestJointDialog, type SmallestJointQuestion } from './smallest-joint-dialog';

const TARGETS: readonly Choice<JointTarget>[] = [
  { value: 'both', label: 'Both' },
  { value: 'staveJoint', label: 'Stave' },
  { value: 'courseJoint', label: 'Course' },
];

const PROFILES: readonly Choice<JointParameters['profile']>[] = [
  { value: 'round', label: 'Round' },
  { value: 'dovetail', label: 'Dovetail' },
];

const SCHEMES: readonly Choice<Scheme>[] = [
  { value: 'alternating', label: 'Tabs alternate' },
  { value: 'one-way', label: 'Tabs one way' },
];

const NAMES: Readonly<Record<JointTarget, string>> = {
  both: 'both joints',
  staveJoint: 'the stave joint',
  courseJoint: 'the course joint',
};

/** Profile, cutter, clearance and scheme, with tab and socket drawn apart as they are typed. */
@Component({
  selector: 'sl-joint-station',
  imports: [AngleField, ChoiceBar, FigureText, Findings, LengthField, MatButton, PictureView],
  templateUrl: './joint-station.html',
  styleUrls: ['../station-shape.scss', './joint-station.scss'],
})
export class JointStation {
  protected readonly store = inject(LayoutStore);
  private readonly dialogs = inject(MatDialog);
  private readonly announcer = inject(Announcer);
  protected readonly proposal = new LayoutProposal(this.store);

  protected readonly targets = TARGETS;
  protected readonly profiles = PROFILES;
  protected readonly schemes = SCHEMES;
  protected readonly bounds = BOUNDS;
  protected readonly unit = this.store.lengthUnit;
  protected readonly access = computed(() => (this.store.rights.editJoint() ? 'open' : 'locked'));

  protected readonly typed = this.proposal.candidate;
  private readonly alike = computed(() => {
    const { staveJoint, courseJoint } = this.typed().joint;
    return sameValue(staveJoint, courseJoint);
  });
  /** Both alike for as long as they are; whoever looks at one of them stays with it. */
  protected readonly target = linkedSignal<boolean, JointTarget>({
    source: this.alike,
    computation: (alike, previous) =>
      previous && previous.value !== 'both' ? previous.value : alike ? 'both' : 'staveJoint',
  });
  protected readonly parameters = computed(() => this.typed().joint[jointShown(this.target())]);
  protected readonly wave = computed(() => {
    const parameters = this.parameters();
    return parameters.profile === 'round' && isWave(parameters);
  });
  protected readonly fields = computed(() => {
    const parameters = this.parameters();
    return jointFields(parameters.profile).map((field) => ({
      ...field,
      value: jointFieldValue(parameters, field.parameter),
      problem: this.problemOf(field.parameter),
    }));
  });
  protected readonly flank = computed(() => {
    const parameters = this.parameters();
    if (parameters.profile !== 'dovetail') return null;
    return { value: parameters.flankAngle, problem: this.problemOf('flankAngle') };
  });

  private readonly drawn = this.proposal.drawn;
  protected readonly maker = computed<PictureMaker>(() => {
    const [layout, unit] = [this.drawn(), this.unit()];
    const joint = jointShown(this.target());
    return (size) => jointPicture(layout, joint, unit, size);
  });
  protected readonly findings = computed(() => jointFindings(this.drawn(), this.unit()));
  protected readonly largest = computed(() => largestCutter(this.drawn(), this.unit()));
  protected readonly taper = signal(0.04);
  protected readonly taperWords = computed(() =>
    taperText(this.drawn(), this.taper(), this.unit()),
  );

  protected choose(target: JointTarget): void {
    this.target.set(target);
    if (target !== 'both' || this.alike()) return;
    const parameters = this.typed().joint.staveJoint;
    this.proposal.wish(wishesFor('both', parameters), 'Make both joints alike');
  }

  protected shape(profile: JointParameters['profile']): void {
    if (profile === this.parameters().profile) return;
    const edges = this.shapedEdges();
    const { clearance } = this.typed().joint;
    const other = otherProfile(this.parameters(), Math.min(...edges), clearance);
    if (!other) {
      this.announcer.tell(
        `No ${profile} joint of this reach fits the tile. Shorten the reach first.`,
      );
      return;
    }
    this.proposal.wish(wishesFor(this.target(), other), `Make ${this.name()} ${profile}`);
  }

  protected set(parameter: string, label: string, value: number): void {
    const parameters = withJointField(this.parameters(), parameter, value);
    this.proposal.wish(
      wishesFor(this.target(), parameters),
      `Set ${label.toLowerCase()} of ${this.name()}`,
    );
  }

  protected smallest(): void {
    const data: SmallestJointQuestion = {
      layout: this.typed(),
      lengthUnit: this.unit(),
      joint: this.name(),
    };
    const asked = this.dialogs.open<SmallestJointDialog, SmallestJointQuestion, JointParameters>(
      SmallestJointDialog,
      { data, width: '560px' },
    );
    asked.afterClosed().subscribe((parameters) => {
      if (!parameters) return;
      const fits = this.shapedEdges().every(
        (edge) => closeProfile(parameters, edge, this.typed().joint.clearance).ok,
      );
      this.proposal.wish(wishesFor(this.target(), parameters), 'Take the smallest joint');
      if (!fits) this.announcer.tell('The tile is too small for this joint. Make it larger first.');
    });
  }

  private name(): string {
    return NAMES[this.target()];
  }

  private shapedEdges(): number[] {
    const { shell } = this.typed();
    const joints =
      this.target() === 'both'
        ? (['staveJoint', 'courseJoint'] as const)
        : [jointShown(this.target())];
    return joints.map((joint) => edgeLengthOf(joint, shell));
  }

  /** What is wrong with a parameter, on whichever of the joints being shaped it is wrong. */
  private problemOf(parameter: string): string | null {
    const joints = Object.keys(wishesFor(this.target(), this.parameters()));
    const found = joints.map((joint) => this.proposal.problemOf(`${joint}.${parameter}`));
    return found.find((problem) => problem !== null) ?? null;
  }
}

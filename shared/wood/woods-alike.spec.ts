import { describe, expect, it } from 'vitest';
import { nearestWood, woodsAlike } from './woods-alike';

const wood = (key: string, colour: string) => ({ key, name: key, colour, sawn: 'flat' as const });

const stocked = [wood('ash', '#DCC39A'), wood('walnut', '#5B3D2A')];

describe('the woods that stand for others', () => {
  it('are those with the same key, whatever their colour', () => {
    expect(woodsAlike([wood('walnut', '#FFFFFF')], stocked)).toEqual([1]);
  });

  it('are else the nearest in colour, when it looks alike', () => {
    expect(woodsAlike([wood('maple', '#DDC59E'), wood('purpleheart', '#7A2E63')], stocked)).toEqual(
      [0, null],
    );
    expect(nearestWood({ colour: '#40281A' }, stocked).index).toBe(1);
  });
});

import { describe, expect, it } from 'vitest';
import { nearestWood, stockWoods, woodsAlike } from './woods-alike';

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
  });

  it('are added where there is nothing like them, as long as there is room', () => {
    const purpleheart = wood('purpleheart', '#7A2E63');
    const roomy = stockWoods(stocked, [purpleheart, wood('ash', '#DCC39A')]);
    expect(roomy.added).toEqual([purpleheart]);
    expect(roomy.indices).toEqual([2, 0]);
    const full = Array.from({ length: 24 }, (_, i) =>
      wood(`wood-${i}`, i === 7 ? '#70305A' : '#FFFFFF'),
    );
    expect(stockWoods(full, [wood('leaf', '#00FF00')]).added).toEqual([]);
    expect(stockWoods(full, [purpleheart]).indices).toEqual([7]);
  });

  it('are found nearest by their colour', () => {
    expect(nearestWood({ colour: '#40281A' }, stocked).index).toBe(1);
  });
});

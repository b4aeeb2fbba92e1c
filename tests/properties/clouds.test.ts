// What holds for any cloud over any surface, in sunlight and in the longwave.
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import {
  absorbedFlux,
  bondAlbedo,
  COVER_ALBEDOS,
  type CoverAlbedo,
  closeLoop,
  cloudShareAbsorbed,
  cloudyAlbedo,
  cloudyEmission,
  findStates,
  greyEmission,
  iceShare,
  mixAlbedo,
  quadraticAlbedo,
  rampAlbedo,
  surfaceShareBelowCloud,
  twoBandAlbedo,
} from "../../src/index.ts";
import { refusal } from "../refusal.ts";
import { settings } from "./settings.ts";

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
/** A dozen roundings of numbers up to 1. */
const ROUNDING = 12 * 2 ** -53;

describe("sunlight between a cloud and a surface", () => {
  const layer = fc
    .record({ reflectance: between(0, 1), taken: between(0, 1), surface: between(0, 1) })
    .filter(({ reflectance, surface }) => reflectance * surface < 0.999)
    .map(({ reflectance, taken, surface }) => ({
      reflectance,
      absorptance: taken * (1 - reflectance),
      surface,
    }));
  const clear = fc
    .record({ reflectance: between(0, 1), surface: between(0, 1) })
    .filter(({ reflectance, surface }) => reflectance * surface < 0.999)
    .map((cloud) => ({ ...cloud, absorptance: 0 }));
  /** Rounding of 1 − Rα is that much larger in what is divided by it. */
  const rounding = (reflectance: number, surface: number) => (2 * ROUNDING) / (1 - reflectance * surface);

  test("is reflected or absorbed, by cloud or surface, and nothing else", () => {
    fc.assert(
      fc.property(layer, (cloud) => {
        const whole = cloudyAlbedo(cloud) + surfaceShareBelowCloud(cloud) + cloudShareAbsorbed(cloud);
        expect(Math.abs(whole - 1)).toBeLessThanOrEqual(rounding(cloud.reflectance, cloud.surface));
      }),
      settings(1000),
    );
  });

  test("a cloud that absorbs nothing brightens every surface by R(1 − α)²/(1 − Rα)", () => {
    fc.assert(
      fc.property(clear, (cloud) => {
        const { reflectance: R, surface: α } = cloud;
        const brighter = (R * (1 - α) ** 2) / (1 - R * α);
        const difference = cloudyAlbedo(cloud) - α - brighter;
        expect(Math.abs(difference)).toBeLessThanOrEqual(rounding(R, α));
      }),
      settings(1000),
    );
  });

  test("cloud and surface may change places when the cloud absorbs nothing", () => {
    fc.assert(
      fc.property(clear, ({ reflectance, absorptance, surface }) => {
        const turned = cloudyAlbedo({ reflectance: surface, absorptance, surface: reflectance });
        const difference = cloudyAlbedo({ reflectance, absorptance, surface }) - turned;
        expect(Math.abs(difference)).toBeLessThanOrEqual(rounding(reflectance, surface));
      }),
      settings(1000),
    );
  });

  test("a brighter surface makes the sky brighter, takes less itself and leaves more to the cloud", () => {
    fc.assert(
      fc.property(layer, between(0, 1), (cloud, more) => {
        const brighter = { ...cloud, surface: cloud.surface + more * (0.999 - cloud.surface) };
        fc.pre(brighter.surface >= cloud.surface && brighter.reflectance * brighter.surface < 0.999);
        const slack = rounding(brighter.reflectance, brighter.surface);
        expect(cloudyAlbedo(brighter)).toBeGreaterThanOrEqual(cloudyAlbedo(cloud) - slack);
        expect(surfaceShareBelowCloud(brighter)).toBeLessThanOrEqual(surfaceShareBelowCloud(cloud) + slack);
        expect(cloudShareAbsorbed(brighter)).toBeGreaterThanOrEqual(cloudShareAbsorbed(cloud) - slack);
      }),
      settings(1000),
    );
  });

  test("a cloud that absorbs can darken snow", () => {
    const cloud = { reflectance: 0.4, absorptance: 0.2, surface: 0.85 };
    expect(cloudyAlbedo(cloud)).toBeLessThan(0.85);
  });

  test("a cloud that takes more than all light is refused", () => {
    const much = { reflectance: 0.7, absorptance: 0.4, surface: 0.1 };
    for (const law of [cloudyAlbedo, surfaceShareBelowCloud, cloudShareAbsorbed]) {
      const { code, path } = refusal(() => law(much));
      expect([code, path]).toEqual(["out-of-range", `${law.card.name}.taken (reflectance + absorptance)`]);
    }
  });

  test("light that cannot get out is refused", () => {
    const mirror = { reflectance: 1, absorptance: 0, surface: 1 };
    expect(refusal(() => cloudyAlbedo(mirror)).code).toBe("out-of-range");
    expect(cloudyAlbedo({ ...mirror, surface: 0.5 })).toBe(1);
  });

  test("shares in whole percents that make 1 are allowed and let nothing pass", () => {
    for (let percent = 0; percent <= 100; percent++) {
      const cloud = { reflectance: percent / 100, absorptance: (100 - percent) / 100, surface: 0.5 };
      expect(surfaceShareBelowCloud(cloud)).toBeLessThanOrEqual(ROUNDING);
    }
  });
});

describe("clouds in the longwave", () => {
  const sky = fc.record({
    clear: between(0, 1000),
    share: between(0, 1),
    emissivity: between(0, 1),
    temperature: between(100, 350),
  });

  test("emit between the clear sky and the black top, by what they fill and how black they are", () => {
    fc.assert(
      fc.property(sky, ({ clear, share, emissivity, temperature }) => {
        const cloudy = cloudyEmission({ clear, share, emissivity, temperature });
        const black = cloudyEmission({ clear, share: 1, emissivity: 1, temperature });
        const slack = 1000 * ROUNDING;
        expect(cloudy).toBeGreaterThanOrEqual(Math.min(clear, black) - slack);
        expect(cloudy).toBeLessThanOrEqual(Math.max(clear, black) + slack);
        const turned = cloudyEmission({ clear, share: emissivity, emissivity: share, temperature });
        expect(cloudy).toBe(turned);
      }),
      settings(500),
    );
  });
});

describe("ice as a share of the surface", () => {
  const ramp = fc.record({
    temperature: between(200, 330),
    frozenBelow: between(230, 262),
    openAbove: between(268, 300),
  });

  test("makes the ramp of rampAlbedo when it covers the sea, and its square that of quadraticAlbedo", () => {
    fc.assert(
      fc.property(ramp, between(0, 1), between(0, 1), (places, cold, warm) => {
        const ice = iceShare(places);
        const covered = (fraction: number) => mixAlbedo({ covers: [{ fraction, albedo: cold }], bare: warm });
        const straight = rampAlbedo({ ...places, cold, warm });
        const curved = quadraticAlbedo({ ...places, cold, warm });
        expect(Math.abs(covered(ice) - straight)).toBeLessThanOrEqual(ROUNDING);
        expect(Math.abs(covered(ice * ice) - curved)).toBeLessThanOrEqual(ROUNDING);
      }),
      settings(500),
    );
  });

  test("needs its two temperatures in order", () => {
    const turned = { temperature: 270, frozenBelow: 280, openAbove: 260 };
    expect(refusal(() => iceShare(turned)).code).toBe("out-of-range");
  });
});

describe("published covers", () => {
  const covers: readonly (readonly [string, CoverAlbedo])[] = Object.entries(COVER_ALBEDOS);

  test.each(covers)("%s reflects what its range allows, and no band more than all", (_, cover) => {
    const { albedo, range, visible = albedo, nearInfrared = albedo } = cover;
    expect(albedo).toBeGreaterThanOrEqual(range[0]);
    expect(albedo).toBeLessThanOrEqual(range[1]);
    // sunlight is about half visible
    const sunlit = twoBandAlbedo({ visible, nearInfrared, visibleShare: 0.52 });
    expect(sunlit).toBeGreaterThanOrEqual(range[0]);
    expect(sunlit).toBeLessThanOrEqual(range[1]);
    expect(Object.isFrozen(cover) && Object.isFrozen(range)).toBe(true);
  });
});

describe("a Bond albedo above 1", () => {
  test("marks the states that need it", () => {
    const loop = closeLoop(({ temperature, given }) => {
      const geometric = given("geometric", 1.2, "1", { within: [0, 2] });
      const albedo = bondAlbedo({ geometric, phaseIntegral: 0.9 });
      return {
        heating: { sunlight: absorbedFlux({ flux: 1361, albedo }), interior: 50 },
        cooling: { longwave: greyEmission({ temperature, emissivity: 1 }) },
        heatCapacity: 0,
      };
    });
    const [state] = findStates(loop, { within: [50, 500] }).states;
    const note = state?.notes.find(({ about }) => about.startsWith("bondAlbedo.reflected"));
    expect(note).toMatchObject({ code: "outside-range", severity: "invalid", range: [0, 1] });
  });

  test("is refused as a number", () => {
    const { code, path } = refusal(() => bondAlbedo({ geometric: 1.4, phaseIntegral: 0.8 }));
    expect([code, path]).toEqual(["out-of-range", "bondAlbedo.reflected (geometric · phaseIntegral)"]);
  });

  test("a geometric albedo above 1 is not", () => {
    expect(bondAlbedo({ geometric: 1.38, phaseIntegral: 0.6 })).toBeCloseTo(0.828, 12);
  });
});

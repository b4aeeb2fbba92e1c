// Heat capacities.
import { atmosphereCapacity, mixedLayerCapacity } from "../../src/index.ts";
import { type Check, halfUnit } from "./check.ts";
import { GILL, HARTMANN, WILLIAMS_KASTING } from "./sources.ts";

const water = (depth: number) => mixedLayerCapacity({ depth, density: 1000, specificHeat: 4180 });
const earthAir = (surfacePressure: number) =>
  atmosphereCapacity({ surfacePressure, gravity: 9.81, specificHeat: 1004 });

export const heatRows: readonly Check[] = [
  {
    covers: ["mixedLayerCapacity"],
    what: "a metre of water",
    published: 4.18e6,
    unit: "J m-2 K-1",
    ours: () => water(1),
    tolerance: halfUnit(1e4),
    because: "half a unit of the last digit",
    source: HARTMANN,
    basis: "from memory",
  },
  {
    covers: ["mixedLayerCapacity"],
    what: "70 m of water",
    published: 2.93e8,
    unit: "J m-2 K-1",
    ours: () => water(70),
    tolerance: halfUnit(1e6),
    because: "half a unit of the last digit",
    source: HARTMANN,
    basis: "from memory",
  },
  {
    covers: ["mixedLayerCapacity"],
    what: "50 m of water",
    published: 2.1e8,
    unit: "J m-2 K-1",
    ours: () => water(50),
    tolerance: halfUnit(1e7),
    because: "half a unit of the last digit",
    source: WILLIAMS_KASTING,
    basis: "from memory",
  },
  {
    covers: ["atmosphereCapacity"],
    what: "the Earth's atmosphere, 10⁵ Pa",
    published: 1.02e7,
    unit: "J m-2 K-1",
    ours: () => earthAir(1e5),
    tolerance: halfUnit(1e5),
    because: "half a unit of the last digit",
    source: HARTMANN,
    basis: "from memory",
  },
  {
    covers: ["atmosphereCapacity", "mixedLayerCapacity"],
    what: "metres of water that hold as much heat as the Earth's atmosphere",
    published: 2.5,
    unit: "m",
    ours: () => earthAir(101325) / water(1),
    tolerance: halfUnit(0.1),
    because: "half a unit of the last digit",
    source: GILL,
    basis: "from memory",
  },
];

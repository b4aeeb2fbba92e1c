// What is given of a stack of leaky layers over a surface, and what comes out.
import type { Streams } from "../greenhouse/stackStreams.ts";
import type { Ledger } from "../states/state.ts";

/** One layer, without heat capacity. */
export interface LeakyLayer {
  /** Share of longwave that it absorbs, and emits of what a black body would; the rest passes. */
  readonly emissivity: number;
  /** Sunlight that it absorbs, W m⁻²; 0 unless said. */
  readonly sunlight?: number;
  /** Heat that air and vapour bring it from the surface, W m⁻²; 0 unless said. */
  readonly convection?: number;
}

/** Layers from the top down, and the surface below them. */
export interface LeakyStackOptions {
  readonly layers: readonly LeakyLayer[];
  readonly surface: {
    /** Sunlight that it absorbs, W m⁻². */
    readonly sunlight: number;
    /** It reflects the rest of the longwave; 1 unless said. */
    readonly emissivity?: number;
    /** Heat from below, W m⁻²; 0 unless said. */
    readonly internalFlux?: number;
    /** K. If given, the surface is not taken to be in balance: it stores heating − emission to space. */
    readonly temperature?: number;
  };
}

/** The longwave of a layer, W m⁻², and its temperature. */
export interface StackLayerState {
  /** The reservoir: `layer 1` at the top. */
  readonly name: string;
  /** K; `null` for a layer of emissivity 0, whose temperature nothing decides. */
  readonly temperature: number | null;
  /** Longwave absorbed. */
  readonly absorbed: number;
  /** Longwave emitted, to both sides together. */
  readonly emitted: number;
}

/** The ledger of a stack of leaky layers, with every stream of longwave. */
export interface LeakyStackLedger extends Ledger {
  /** From the top down. */
  readonly layers: readonly StackLayerState[];
  readonly surface: Omit<StackLayerState, "temperature"> & { readonly temperature: number };
  /** Longwave from the top (0) to the surface (N), W m⁻²: U, D, U − D and U + D. */
  readonly interfaces: readonly Streams<number>[];
}

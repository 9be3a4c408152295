import type { ComponentType } from 'react';
import {
  BubbleColumn,
  FluidisedBed,
  PackedBed,
  PackedColumn,
  StirredTank,
  StructuredPacking,
  Tray,
  TrickleBed,
} from './columns';
import { Annulus, HelicalCoil, Monolith, Pipe, RectangularDuct, WettedWall } from './confined-flow';
import {
  Bubble,
  CylinderInCrossFlow,
  Drop,
  FlatPlate,
  ImpingingJet,
  RotatingCylinder,
  RotatingDisc,
  Sphere,
} from './external-flow';
import { HollowFibreLumen, HollowFibreShell, MembraneChannel, SpacerChannel, StirredCell } from './membranes';
import {
  CylinderFreeConvection,
  FallingFilm,
  HorizontalPlateFreeConvection,
  LiquidPool,
  OpenWater,
  SphereFreeConvection,
  Stream,
  VerticalPlateFreeConvection,
} from './surfaces';

/** Sketches by the geometry's slug. */
const SKETCHES: Record<string, ComponentType | undefined> = {
  annulus: Annulus,
  bubble: Bubble,
  'bubble-column': BubbleColumn,
  'cylinder-free-convection': CylinderFreeConvection,
  'cylinder-in-cross-flow': CylinderInCrossFlow,
  drop: Drop,
  'falling-film': FallingFilm,
  'flat-plate': FlatPlate,
  'fluidised-bed': FluidisedBed,
  'helical-coil': HelicalCoil,
  'hollow-fibre-lumen': HollowFibreLumen,
  'hollow-fibre-shell': HollowFibreShell,
  'horizontal-plate-free-convection': HorizontalPlateFreeConvection,
  'impinging-jet': ImpingingJet,
  'liquid-pool': LiquidPool,
  'membrane-channel': MembraneChannel,
  monolith: Monolith,
  'open-water': OpenWater,
  'packed-bed': PackedBed,
  'packed-column': PackedColumn,
  pipe: Pipe,
  'rectangular-duct': RectangularDuct,
  'rotating-cylinder': RotatingCylinder,
  'rotating-disc': RotatingDisc,
  'spacer-channel': SpacerChannel,
  sphere: Sphere,
  'sphere-free-convection': SphereFreeConvection,
  'stirred-cell': StirredCell,
  'stirred-tank': StirredTank,
  stream: Stream,
  'structured-packing': StructuredPacking,
  tray: Tray,
  'trickle-bed': TrickleBed,
  'vertical-plate-free-convection': VerticalPlateFreeConvection,
  'wetted-wall': WettedWall,
};

/** The sketch of a geometry, or undefined where none has been drawn. */
export function sketchOf(slug: string): ComponentType | undefined {
  return Object.hasOwn(SKETCHES, slug) ? SKETCHES[slug] : undefined;
}

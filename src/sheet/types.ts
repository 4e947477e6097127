import type { Quantity, Typed } from '../core'

/**
 * The document of the program. Units are SI (V, A, Ω, H, F, W, var, Hz, s), values rms, angles in
 * degrees in (−180°, 180°] and anticlockwise positive, so that a positive angle leads the reference;
 * places on the paper are in millimetres, x to the right and y up. Every part is read only: a change
 * is an `Edit`, which makes a new sheet.
 */

export type { Quantity, Typed } from '../core'

/** A name inside a sheet: a letter, then up to fifteen letters, digits or underscores. */
export type Id = string
/** The `Id` of a phasor. */
export type PhasorId = Id

/** What a display showed: a string keeps the digits as read. */
export type Shown = number | string

/** A place on the paper in millimetres, x to the right, y up, from the lower left corner. */
export interface Place {
  readonly x: number
  readonly y: number
}

/** Where the tail of a phasor lies that is no term of a sum: a place, or another phasor's tip. */
export type Tail = Place | { readonly tipOf: PhasorId }

interface PhasorCommon {
  readonly id: PhasorId
  /** The first letter is the symbol, the rest its subscript: `Vcoil`. */
  readonly label: string
  readonly quantity: Quantity
  /** The terminal at the tail of the positive direction (IEC 60375). */
  readonly from?: string
  /** The terminal at the head of the positive direction. */
  readonly to?: string
  readonly tail?: Tail
}

/**
 * A phasor: typed polar, each part on its own; or typed rectangular, both parts; or not typed, to be
 * read or solved.
 */
export type Phasor = PhasorCommon & {
  readonly magnitude?: Typed
  readonly angle?: Typed
  readonly real?: Typed
  readonly imaginary?: Typed
}

/** Whether an angle is ahead of what it was measured against, or behind it. */
export type Sense = 'leads' | 'lags'

/** The mistakes that can explain readings which do not agree. */
export type Mistake =
  | 'reversed'
  | 'peak-as-rms'
  | 'peak-to-peak-as-rms'
  | 'rms-as-peak'
  | 'turns-not-divided'
  | 'turns-divided-twice'
  | 'ratio-left-out'
  | 'ratio-applied-twice'
  | 'wrong-ratio'
  | 'line-as-phase'
  | 'phase-as-line'
  | 'decade-slip'
  | 'digits-transposed'
  | 'lead-lag-swapped'
  | 'half-period'
  | 'double-period'
  | 'wrong-angle-reference'
  | 'readings-swapped'
  | 'phases-swapped'
  | 'winding-resistance-omitted'
  | 'element-decade-slip'
  | 'element-changed'
  | 'distorted-waveform'
  | 'one-reading-off'

/** A correction that someone made to a reading: the original is kept. */
export interface Correction {
  readonly mistake: Mistake
  readonly original: object
  readonly by?: string
  readonly date?: string
  readonly reason?: string
}

interface ReadingCommon {
  readonly id: Id
  readonly of: PhasorId
  readonly instrument?: Id
  readonly channel?: Id
  readonly range?: number
  /** Half-width in the unit of what is shown; omitted: from the instrument, else assumed. */
  readonly limit?: number
  /** One indication a pass: what is shown is then their mean. */
  readonly repeats?: readonly number[]
  /** Readings with the same pass name were taken at one time. */
  readonly pass?: string
  /** Kept, and not used. */
  readonly struck?: boolean
  readonly corrected?: Correction
}

/** The size of a phasor as a meter showed it. */
export type MagnitudeReading = ReadingCommon & {
  readonly kind: 'magnitude'
  readonly shown: Shown
  readonly form?: 'rms' | 'peak' | 'peak-to-peak'
  /** Conductor passes through the clamp: divide. */
  readonly turns?: number
  /** The ratio of a CT, VT or probe: multiply. */
  readonly ratio?: number
  /** Ω. A voltage read across it, so a current: divide. */
  readonly shunt?: number
}

/** An angle in degrees; without a sense it is signed, anticlockwise positive. */
export type AngleReading = ReadingCommon & {
  readonly kind: 'angle'
  readonly shown: Shown
  readonly against?: PhasorId
  readonly sense?: Sense
}

/** A shift along a time base; both in divisions or both in seconds. */
export type ShiftReading = ReadingCommon & {
  readonly kind: 'shift'
  readonly shift: Shown
  readonly period: Shown
  readonly against?: PhasorId
  readonly sense: Sense
}

/** An ellipse of one trace against another: sin φ = intercept / height. */
export type EllipseReading = ReadingCommon & {
  readonly kind: 'ellipse'
  readonly intercept: Shown
  readonly height: Shown
  readonly tilt?: 'rising' | 'falling'
  readonly against?: PhasorId
  readonly sense?: Sense
}

/** A wattmeter or var meter: real or imaginary part of V · I*, of the voltage with the current. */
export type PowerReading = ReadingCommon & {
  readonly kind: 'power' | 'reactive-power'
  readonly shown: Shown
  readonly with: PhasorId
  readonly ratio?: number
  readonly currentChannel?: Id
}

/** A power factor meter: the current leads or lags. */
export type PowerFactorReading = ReadingCommon & {
  readonly kind: 'power-factor'
  readonly shown: Shown
  readonly with: PhasorId
  readonly sense?: Sense
}

/** One indication of one meter, as it was shown. */
export type Reading =
  | MagnitudeReading
  | AngleReading
  | ShiftReading
  | EllipseReading
  | PowerReading
  | PowerFactorReading

/** An accuracy statement as the maker prints it. */
export interface Accuracy {
  readonly of: 'voltage' | 'current' | 'power' | 'angle' | 'time' | 'resistance'
  readonly range?: number
  readonly text: string
}

/** A meter, with what is known of it. */
export interface Instrument {
  readonly id: Id
  readonly name: string
  readonly serial?: string
  /** ISO 8601 date. */
  readonly calibrationDue?: string
  /** Measurement category and voltage: `CAT III 600 V`. */
  readonly category?: string
  readonly responding?: 'true-rms' | 'average'
  readonly angles?: 'lead-positive' | 'lag-positive'
  readonly inputResistance?: Typed
  readonly accuracy?: readonly Accuracy[]
}

/** A CT, VT, probe or clamp that several readings share. */
export interface Channel {
  readonly id: Id
  readonly label?: string
  readonly ratio?: Typed
  readonly turns?: number
  readonly phaseError?: Typed
  readonly reversed?: boolean
}

/** A term of a sum. */
export interface Term {
  readonly phasor: PhasorId
  readonly sign?: 1 | -1
}

/** Phasors that add up, in drawing order. */
export interface Sum {
  readonly id: Id
  readonly label?: string
  readonly terms: readonly Term[]
  /** The phasor it must equal; 0: it must close on itself; omitted: just the resultant. */
  readonly equals?: PhasorId | 0
  readonly arrangement?: 'tip-to-tail' | 'from-origin'
  readonly start?: Place
}

interface ElementCommon {
  readonly id: Id
  readonly label?: string
  readonly voltage: PhasorId
  readonly current: PhasorId
  readonly rating?: { readonly voltage?: number; readonly current?: number }
  /** The nameplate: it drives the prediction and never bends the estimate. */
  readonly marked?: {
    readonly resistance?: Typed
    readonly inductance?: Typed
    readonly capacitance?: Typed
    readonly reactance?: Typed
  }
}

/** A two-terminal element, V = Z · I. */
export type CircuitElement = ElementCommon &
  (
    | { readonly kind: 'resistor'; readonly resistance?: Typed }
    | {
        readonly kind: 'coil'
        readonly resistance?: Typed
        readonly inductance?: Typed
        readonly dcResistance?: Typed
      }
    | { readonly kind: 'capacitor'; readonly capacitance?: Typed; readonly resistance?: Typed }
    | { readonly kind: 'impedance'; readonly resistance?: Typed; readonly reactance?: Typed }
  )

/** The builder's tree of elements. */
export type CircuitNode =
  | { readonly element: Id }
  | { readonly series: readonly CircuitNode[] }
  | { readonly parallel: readonly CircuitNode[] }

/** Three phasors that are one three-phase system; the neutral is positive from load to source. */
export interface ThreePhase {
  readonly id: Id
  readonly label?: string
  readonly phasors: readonly [Id, Id, Id]
  readonly kind?: 'phase' | 'line'
  readonly connection?: 'star' | 'delta'
  readonly wires?: 3 | 4
  readonly neutral?: PhasorId
  readonly names?: readonly [string, string, string]
  readonly currents?: readonly [Id, Id, Id]
}

/** An arrow that a hand drew, and what it stands for. */
export interface HandArrow {
  readonly id: Id
  readonly sum?: Id
  readonly stands: PhasorId | 'closing'
  readonly from: Place
  readonly to: Place
}

/** A hazard and its control, recorded before measuring. */
export interface Hazard {
  readonly hazard: string
  readonly control: string
  readonly risk: 'low' | 'medium' | 'high'
  readonly supervision?: string
}

/** A signature that no longer holds, since the sheet was changed after it. */
export interface VoidedSignature {
  readonly kind: 'checked' | 'approved'
  readonly by: string
  /** The day on which it was given, ISO 8601. */
  readonly date?: string
  /** The revision that it was given for. */
  readonly revision?: string
}

/** Which job the sheet belongs to; dates are ISO 8601. */
export interface Job {
  readonly number?: string
  readonly site?: string
  readonly circuit?: string
  readonly conditions?: string
  readonly testedBy?: string
  readonly checkedBy?: string
  readonly checkedDate?: string
  readonly approvedBy?: string
  readonly approvedDate?: string
  /** The day of the test. */
  readonly date?: string
  /** The oldest first. */
  readonly voided?: readonly VoidedSignature[]
  readonly notes?: string
}

/** How much 10 mm of paper stand for, each in the unit of its quantity. */
export type UnitsPerCentimetre = { readonly [quantity in Quantity]?: number }

/** How the sheet is drawn; what is omitted is chosen to fit. */
export interface Drawing {
  readonly paper?: 'A4' | 'A3' | 'Letter'
  readonly orientation?: 'landscape' | 'portrait'
  readonly origin?: Place
  readonly unitsPerCentimetre?: UnitsPerCentimetre
  readonly tolerance?: { readonly millimetres?: number; readonly degrees?: number }
}

/** One diagram with the readings behind it: what is drawn, listed, linked, kept and printed. */
export interface Sheet {
  readonly format: 'phasogon-sheet'
  readonly version: 1
  readonly title: string
  readonly revision?: string
  readonly job?: Job
  /** Hz; exact where no limit is stated. */
  readonly frequency?: Typed
  readonly reference?: PhasorId
  readonly supply?: PhasorId
  /** Limits where none is stated: 1 %, 1°, 5 %. */
  readonly assumed?: {
    readonly percent?: number
    readonly degrees?: number
    readonly elementPercent?: number
  }
  /** ± % by which the supply may have moved between passes. */
  readonly drift?: number
  readonly phasors: readonly Phasor[]
  readonly readings?: readonly Reading[]
  readonly instruments?: readonly Instrument[]
  readonly channels?: readonly Channel[]
  readonly sums?: readonly Sum[]
  readonly elements?: readonly CircuitElement[]
  readonly circuit?: CircuitNode
  readonly threePhase?: readonly ThreePhase[]
  /** Which of several solutions is meant: the nearest wins. */
  readonly chosen?: readonly {
    readonly phasor: Id
    readonly magnitude: number
    readonly angle: number
  }[]
  readonly hand?: readonly HandArrow[]
  readonly drawing?: Drawing
  /** What the cautions go by beside the usual limits. */
  readonly safety?: {
    /** V rms: the touch voltage above which a caution is due, where it is lower than 50 V, as in wet places. */
    readonly voltageLimit?: number
    /** Ω: the resistor through which capacitors are to be discharged. */
    readonly dischargeResistance?: number
  }
  readonly report?: {
    readonly hazards?: readonly Hazard[]
    readonly criterion?: string
    readonly conclusion?: string
  }
}

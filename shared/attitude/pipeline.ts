import type { Convention, EulerConvention, QuaternionConvention } from './convention.ts';
import { canonicalSequence, componentMap, conjugates, elementMap, IDENTITY, transposesMatrix, type ComponentMap } from './kernels/frames.ts';
import { angleReader } from './kernels/read-angles.ts';
import { matrixAsMatrix, matrixAsQuaternion } from './kernels/read-matrix.ts';
import { quaternionReader } from './kernels/read-quaternion.ts';
import { axisAngleReader, readGibbs, readMrp, rotationVectorReader } from './kernels/read-vectors.ts';
import { relabelMatrix, relabelQuaternion } from './kernels/relabel.ts';
import { anglesOfMatrixSame, anglesOfMatrixThree, anglesOfQuaternionSame, anglesOfQuaternionThree } from './kernels/euler.gen.ts';
import { quickAnglesOfMatrixSame, quickAnglesOfMatrixThree, quickAnglesOfQuaternionSame, quickAnglesOfQuaternionThree } from './kernels/quick-euler.gen.ts';
import { quickMatrixOfQuaternion } from './kernels/quick-rotation.gen.ts';
import { matrixOfQuaternion } from './kernels/rotation.gen.ts';
import { FINE, REFUSED, type Reader, type Writer } from './kernels/status.ts';
import { angleWriter } from './kernels/write-angles.ts';
import { matrixWriter } from './kernels/write-matrix.ts';
import { quaternionWriter } from './kernels/write-quaternion.ts';
import { axisAngleWriter, gibbsWriter, mrpWriter, rotationVectorWriter } from './kernels/write-vectors.ts';
import { determinantOf, relabellingBetween } from './relabelling.ts';

/** One attitude's way from the numbers of one convention to those of another, by way of the scratch. */
export interface Pipeline {
  /** Status of reading: FINE, REPAIRED or REFUSED. */
  readonly read: Reader;
  /** Status of writing: FINE, LOCKED or NOT_REPRESENTABLE. */
  readonly write: Writer;
}

/** Below this, numbers that went through a quaternion cannot tell a small cosine from zero: half angles are known to 2^-53 each. */
const LOCK_FROM_QUATERNION = 8.9e-16;
/** Below this, the double-double steps from angles to a matrix cannot. */
const LOCK_FROM_ANGLES = 2 ** -96;
/** A clean matrix' elements are taken as exact. */
const LOCK_FROM_MATRIX = 0;

const UNMOVED = componentMap({ left: IDENTITY, right: IDENTITY }, false, false);

/**
 * Matrix elements and angles go to angles and matrices as a matrix, which keeps their exact zeros and small cosines;
 * everything else goes as a quaternion.
 */
export function pipelineBetween(from: Convention, to: Convention, repair: 'none' | 'nearest'): Pipeline {
  const asMatrix = (from.representation === 'euler' || from.representation === 'dcm') && (to.representation === 'euler' || to.representation === 'dcm');
  return asMatrix ? matrixPipeline(from, to, repair) : quaternionPipeline(from, to, repair);
}

function matrixPipeline(from: Convention, to: Convention, repair: 'none' | 'nearest'): Pipeline {
  const elements = elementMap(relabellingBetween(from, to), transposesMatrix(from), transposesMatrix(to));
  const unmoved = elementMap({ left: IDENTITY, right: IDENTITY }, false, false);
  const read = from.representation === 'dcm'
    ? matrixAsMatrix({ elements, determinant: determinantOf(to), repair })
    : angleReader(from as EulerConvention, 'matrix', to.representation === 'dcm' ? 'rounded' : 'pairs');
  if (to.representation === 'dcm') return { read, write: matrixWriter(from.representation === 'dcm' ? unmoved : elements) };
  const write = anglesFromMatrix(to as EulerConvention, from.representation === 'dcm' ? LOCK_FROM_MATRIX : LOCK_FROM_ANGLES);
  if (from.representation === 'dcm') return { read, write };
  return {
    read,
    write: (numbers, at) => {
      relabelMatrix(elements);
      return write(numbers, at);
    },
  };
}

function anglesFromMatrix(to: EulerConvention, lockAt: number): Writer {
  const { symmetric } = canonicalSequence(to);
  return anglesWriter(symmetric ? quickAnglesOfMatrixSame : quickAnglesOfMatrixThree, symmetric ? anglesOfMatrixSame : anglesOfMatrixThree, to, lockAt);
}

/** The quick kernels' answer where it is settled, else the double-double ones'. */
function anglesWriter(takeQuick: () => boolean, take: () => void, to: EulerConvention, lockAt: number): Writer {
  const { write, writeQuick } = angleWriter(to, lockAt);
  return (numbers, at) => {
    if (takeQuick() && writeQuick(numbers, at) === FINE) return FINE;
    take();
    return write(numbers, at);
  };
}

function quaternionPipeline(from: Convention, to: Convention, repair: 'none' | 'nearest'): Pipeline {
  const relabelling = relabellingBetween(from, to);
  if (to.representation === 'dcm') {
    const write = matrixWriter(elementMap(relabelling, conjugates(from), transposesMatrix(to)));
    return {
      read: readerBetween(from, UNMOVED, repair, 'pairs'),
      write: (numbers, at) => {
        if (!quickMatrixOfQuaternion()) matrixOfQuaternion();
        return write(numbers, at);
      },
    };
  }
  const components = componentMap(relabelling, conjugates(from), conjugates(to));
  return {
    read: readerBetween(from, components, repair, to.representation === 'quaternion' && components.terms === 1 ? 'rounded' : 'pairs'),
    write: quaternionWriterOf(from, to, components.terms),
  };
}

/** Reads as QUATERNION and relabels it. */
function readerBetween(from: Convention, components: ComponentMap, repair: 'none' | 'nearest', precision: 'rounded' | 'pairs'): Reader {
  if (from.representation === 'quaternion') return quaternionReader(from, repair, components);
  const read = quaternionReaderOf(from, repair, precision);
  if (components === UNMOVED) return read;
  return (numbers, at) => {
    const status = read(numbers, at);
    if (status !== REFUSED) relabelQuaternion(components);
    return status;
  };
}

function quaternionReaderOf(from: Exclude<Convention, QuaternionConvention>, repair: 'none' | 'nearest', precision: 'rounded' | 'pairs'): Reader {
  switch (from.representation) {
    case 'euler': return angleReader(from, 'quaternion', precision);
    case 'dcm': return matrixAsQuaternion({ elements: elementMap({ left: IDENTITY, right: IDENTITY }, transposesMatrix(from), false), determinant: 1, repair }, precision);
    case 'rotation-vector': return rotationVectorReader(from.unit);
    case 'axis-angle': return axisAngleReader(from.unit);
    case 'mrp': return readMrp;
    case 'gibbs': return readGibbs;
  }
}

function quaternionWriterOf(from: Convention, to: Convention, terms: 1 | 2 | 4): Writer {
  // Components that are given, or sums of two that are, come exact; every other way rounds.
  const rounded = from.representation !== 'quaternion' && from.representation !== 'gibbs' || terms === 4;
  switch (to.representation) {
    case 'quaternion': {
      // A clean quaternion is passed on as it stands: merely listing it otherwise must not change a bit of it.
      const unit = from.representation !== 'mrp' && from.representation !== 'gibbs';
      return quaternionWriter(to, unit && terms === 1 ? 'keep' : 'divide', rounded);
    }
    case 'rotation-vector': return rotationVectorWriter(to.unit, rounded);
    case 'axis-angle': return axisAngleWriter(to.unit, rounded);
    case 'mrp': return mrpWriter(rounded);
    case 'gibbs': return gibbsWriter(rounded);
    case 'euler': {
      const { symmetric } = canonicalSequence(to);
      return anglesWriter(symmetric ? quickAnglesOfQuaternionSame : quickAnglesOfQuaternionThree, symmetric ? anglesOfQuaternionSame : anglesOfQuaternionThree, to, LOCK_FROM_QUATERNION);
    }
    case 'dcm': throw new Error('a matrix is written by way of a matrix');
  }
}

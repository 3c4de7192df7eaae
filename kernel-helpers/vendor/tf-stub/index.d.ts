export declare class Tensor {
  readonly shape: number[];
}
export interface Tensor1D extends Tensor {}
export interface Tensor2D extends Tensor {}
export interface Scalar extends Tensor {}
export type Rank = string;
export type TensorLike = unknown;
export type DataType = string;
export declare namespace data {
  interface CSVDataset {}
  interface CSVConfig {}
}

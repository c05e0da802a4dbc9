import { Column, ForeignKey, PrimaryColumn, type ColumnOptions } from 'typeorm'

/** Column decorators with their types spelled out: no bundler has to guess them. */
const of =
  (type: NonNullable<ColumnOptions['type']>, fixed: ColumnOptions = {}) =>
  (options: ColumnOptions = {}): PropertyDecorator =>
    Column({ type, ...fixed, ...options } as ColumnOptions)

export const Id = (): PropertyDecorator => PrimaryColumn({ type: 'uuid' })
export const Text = of('text')
export const Uuid = of('uuid')
export const Whole = of('integer')
/** Lengths and shares. */
export const Real = of('double precision')
export const Flag = of('boolean')
export const Bytes = of('bytea')
export const Texts = of('text', { array: true })
export const Reals = of('double precision', { array: true })
export const Json = of('jsonb')
export const Day = of('date')
/** To the millisecond, so that a moment survives a round trip through JSON and can lead a page. */
export const Moment = of('timestamp with time zone', { precision: 3 })

/** A column that points at another table's row; named by its table so that files do not import one another in circles. */
export const Ref =
  (
    table: string,
    onDelete: 'CASCADE' | 'SET NULL' | 'RESTRICT' = 'CASCADE',
    options: ColumnOptions = {},
  ): PropertyDecorator =>
  (target, property) => {
    Uuid(options)(target, property)
    ForeignKey(table, { onDelete })(target, property)
  }

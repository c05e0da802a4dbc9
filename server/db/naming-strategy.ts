import { DefaultNamingStrategy, type NamingStrategyInterface } from 'typeorm'

const snake = (name: string): string => name.replace(/[A-Z]/g, (letter) => `_${letter.toLowerCase()}`)

/** Columns are named in snake_case after their properties; everything else as TypeORM has it. */
export const namingStrategy: NamingStrategyInterface = Object.assign(new DefaultNamingStrategy(), {
  columnName: (property: string, given: string | undefined): string => given ?? snake(property),
})

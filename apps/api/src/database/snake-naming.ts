import { DefaultNamingStrategy, type Table, type View } from 'typeorm';

/** Column names in snake case and constraint names that a person can read in an error or a migration. */
export class SnakeNaming extends DefaultNamingStrategy {
  override columnName(property: string, custom: string | undefined, prefixes: string[]): string {
    return [...prefixes.map(snake), custom ?? snake(property)].join('_');
  }

  override joinColumnName(relation: string, referenced: string): string {
    return `${snake(relation)}_${snake(referenced)}`;
  }

  override primaryKeyName(table: Table | string): string {
    return named(table, [], 'pk');
  }

  override uniqueConstraintName(table: Table | string, columns: string[]): string {
    return named(table, columns, 'uq');
  }

  override relationConstraintName(table: Table | string, columns: string[]): string {
    return named(table, columns, 'rel');
  }

  override foreignKeyName(table: Table | string, columns: string[]): string {
    return named(table, columns, 'fk');
  }

  override indexName(table: Table | View | string, columns: string[], where?: string): string {
    return named(table, columns, where ? 'pix' : 'ix');
  }
}

function snake(name: string): string {
  return name.replace(/([a-z0-9])([A-Z])/g, '$1_$2').toLowerCase();
}

// PostgreSQL cuts identifiers at 63 bytes; cutting here keeps the entity and the schema in agreement.
function named(table: Table | View | string, columns: string[], suffix: string): string {
  const path = typeof table === 'string' ? table : table.name;
  const tableName = path.slice(path.lastIndexOf('.') + 1);
  return `${[tableName, ...[...columns].sort()].join('_').slice(0, 58)}_${suffix}`;
}

/**
 * The SQL that makes a table with a `brand_id` a tenant's: whoever is held by row-level security
 * sees and writes the rows of the brand that app.brand names, and none when it names none.
 */
export const tenant = (table: string): string => /* sql */ `
ALTER TABLE ${table} ENABLE ROW LEVEL SECURITY;
CREATE POLICY of_the_brand ON ${table}
  USING (brand_id = app_brand()) WITH CHECK (brand_id = app_brand());
`

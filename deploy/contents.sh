# Sourced by backup and restore: what a database holds, as one line a table: SHA-256 of its sorted rows, their number, its name.

contents_of_sqlite() { # file
    local table rows
    rows=$(mktemp)
    sqlite3 -readonly "$1" "SELECT name FROM sqlite_master WHERE type = 'table' AND name NOT LIKE 'sqlite\_%' ESCAPE '\' ORDER BY name" |
        while IFS= read -r table; do
            sqlite3 -readonly "$1" '.mode quote' "SELECT * FROM \"$table\"" >"$rows"
            echo "$(LC_ALL=C sort "$rows" | sha256sum | cut -c 1-64) $(sqlite3 -readonly "$1" "SELECT count(*) FROM \"$table\"") $table"
        done
    rm -f "$rows"
}

# Rows as text must not depend on a server's or a person's settings.
export PGOPTIONS='-c timezone=UTC -c datestyle=ISO -c intervalstyle=iso_8601 -c extra_float_digits=1 -c bytea_output=hex -c search_path=public'

# Lines for psql that list the contents of the database it is connected to in the file $CONTENTS; $ROWS is a file to work in.
contents_script() {
    cat <<'PSQL'
\pset tuples_only on
\pset format unaligned
\o :script
SELECT format($f$\copy public.%I to program 'cat >"$ROWS"; echo "$(LC_ALL=C sort "$ROWS" | sha256sum | cut -c 1-64) $(wc -l <"$ROWS") %s" >>"$CONTENTS"'$f$, tablename, tablename)
  FROM pg_tables WHERE schemaname = 'public' ORDER BY tablename COLLATE "C";
\o
\i :script
PSQL
}

contents_of_postgresql() { # connection, file to write
    local work
    work=$(mktemp -d)
    : >"$2"
    contents_script | CONTENTS=$2 ROWS=$work/rows psql --no-psqlrc --quiet --set=ON_ERROR_STOP=1 --set=script="$work/script" "$1" >/dev/null
    local code=$?
    rm -rf "$work"
    return $code
}

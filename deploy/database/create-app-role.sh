#!/usr/bin/env bash
# Run once by the database image on an empty volume: makes the role that the app works as. 'admin migrate' gives it its rights.
set -euo pipefail
psql --set=ON_ERROR_STOP=1 --username "$POSTGRES_USER" --dbname "$POSTGRES_DB" --set=password="$(cat /run/secrets/app_password)" <<'SQL'
CREATE ROLE joint_planner_app LOGIN PASSWORD :'password';
SQL

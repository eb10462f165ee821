-- Questions to the Parquet files of many runs, for DuckDB. Run in the folder above 'results'; values are SI, columns in parquet-columns.md.

-- The worst member of each model.
SELECT model, arg_max(key, utilization) AS worst, round(max(utilization), 3) AS utilization, count(*) AS candidates
FROM read_parquet('results/**/*.parquet')
GROUP BY model
ORDER BY utilization DESC NULLS LAST, model;

-- Sections that are overstressed, most often first, over all models.
SELECT section, count(*) AS members, count(DISTINCT model) AS models, round(max(stress_Pa) / 1e6, 1) AS largest_stress_MPa
FROM read_parquet('results/**/*.parquet')
WHERE status = 'OVERSTRESSED'
GROUP BY section
ORDER BY members DESC, section;

-- What could not be checked, by reason.
SELECT reasonCode, count(*) AS members, count(DISTINCT model) AS models
FROM read_parquet('results/**/*.parquet')
WHERE status = 'NOT CHECKED'
GROUP BY reasonCode
ORDER BY members DESC, reasonCode;

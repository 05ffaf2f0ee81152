using Microsoft.EntityFrameworkCore.Migrations;

#nullable disable

namespace JointPlanner.Archive.Sqlite.Migrations
{
    /// <inheritdoc />
    public partial class SettingAgeAndTemperatures : Migration
    {
        /// <inheritdoc />
        protected override void Up(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.AddColumn<double>(
                name: "DeckAge",
                table: "SettingRecords",
                type: "REAL",
                nullable: true);

            migrationBuilder.AddColumn<string>(
                name: "TemperaturesRead",
                table: "SettingRecords",
                type: "TEXT",
                nullable: true);
        }

        /// <inheritdoc />
        protected override void Down(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.DropColumn(
                name: "DeckAge",
                table: "SettingRecords");

            migrationBuilder.DropColumn(
                name: "TemperaturesRead",
                table: "SettingRecords");
        }
    }
}

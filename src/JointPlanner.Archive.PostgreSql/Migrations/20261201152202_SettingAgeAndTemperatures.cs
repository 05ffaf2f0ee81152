using Microsoft.EntityFrameworkCore.Migrations;

#nullable disable

namespace JointPlanner.Archive.PostgreSql.Migrations
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
                type: "double precision",
                nullable: true);

            migrationBuilder.AddColumn<string>(
                name: "TemperaturesRead",
                table: "SettingRecords",
                type: "text",
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

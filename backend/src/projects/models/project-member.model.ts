import { Column, DataType, Model, PrimaryKey, Table } from 'sequelize-typescript';

@Table({ tableName: 'project_members', timestamps: false })
export class ProjectMember extends Model {
  @PrimaryKey
  @Column(DataType.UUID)
  declare projectId: string;

  @PrimaryKey
  @Column(DataType.UUID)
  declare userId: string;
}
